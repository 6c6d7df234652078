import { describe, expect, it } from 'vitest'
import { importsOf, listSources, type Import } from './import-graph'

interface Layer {
  readonly folder: string
  /** Folders that it may import from, its own included. */
  readonly mayImport: readonly string[]
  /** Packages that it may import, if the list is short. */
  readonly packages?: readonly string[]
}

const LAYERS: readonly Layer[] = [
  { folder: 'shared', mayImport: ['shared'], packages: ['zod'] },
  { folder: 'server', mayImport: ['server', 'shared'] },
  { folder: 'src', mayImport: ['src', 'shared'] },
  { folder: 'migrations', mayImport: [], packages: ['knex'] },
  { folder: 'seeds', mayImport: ['seeds', 'server', 'shared'] },
]

/** The list of migrations and the database command reach out of the server on purpose. */
const EXCEPTIONS: readonly [from: string, folder: string][] = [
  ['server/db/migrations.ts', 'migrations'],
  ['server/db/cli.ts', 'seeds'],
]

const folderOf = (path: string): string => path.split('/', 1)[0] ?? ''
const packageOf = (specifier: string): string =>
  specifier
    .split('/')
    .slice(0, specifier.startsWith('@') ? 2 : 1)
    .join('/')

const isException = ({ from }: Import, to: string): boolean =>
  EXCEPTIONS.some(([file, folder]) => file === from && folder === folderOf(to))

const strays = ({ mayImport, packages }: Layer, imports: readonly Import[]): string[] =>
  imports
    .filter((one) =>
      one.to === null
        ? packages !== undefined && !packages.includes(packageOf(one.specifier))
        : !mayImport.includes(folderOf(one.to)) && !isException(one, one.to),
    )
    .map(({ from, specifier }) => `${from} imports ${specifier}`)

describe('imports run one way', () => {
  it.each(LAYERS)('$folder imports only $mayImport', (layer) => {
    const imports = listSources(layer.folder).flatMap(importsOf)
    expect(imports.length).toBeGreaterThan(0)
    expect(strays(layer, imports)).toEqual([])
  })

  it('are seen by this test whatever their form', () => {
    const from = 'shared/units/brands.ts'
    const shared = LAYERS[0]
    const server: Import = { from, specifier: '#server/app', to: 'server/app.ts' }
    const node: Import = { from, specifier: 'node:fs', to: null }
    const inside: Import = { from, specifier: './length', to: 'shared/units/length.ts' }
    expect(shared && strays(shared, [server, node, inside])).toEqual([
      `${from} imports #server/app`,
      `${from} imports node:fs`,
    ])
  })

  it('reach routes from the composition alone', () => {
    const strangers = listSources('server')
      .flatMap(importsOf)
      .filter(({ to }) => to !== null && /^server\/features\/.*\.routes\.ts$/.test(to))
      .filter(({ from }) => from !== 'server/composition.ts')
    expect(strangers).toEqual([])
  })

  it('read process.env in one place of the server', async () => {
    const { readFile } = await import('node:fs/promises')
    const readers: string[] = []
    for (const file of listSources('server')) {
      if ((await readFile(file, 'utf8')).includes('process.env')) readers.push(file)
    }
    expect(readers).toEqual(['server/config.ts'])
  })
})
