import { existsSync, readdirSync, readFileSync } from 'node:fs'
import { dirname, join, posix, relative } from 'node:path'
import { fileURLToPath } from 'node:url'
import ts from 'typescript'

const ROOT = fileURLToPath(new URL('../../..', import.meta.url))

export interface Import {
  /** Path of the importing file, from the root. */
  readonly from: string
  /** As written. */
  readonly specifier: string
  /** Path of the file meant, from the root; null for a package. */
  readonly to: string | null
}

const isSource = (name: string): boolean => /\.tsx?$/.test(name) && !name.endsWith('.d.ts')

/** Every source file below a folder of the repository. */
export const listSources = (folder: string): string[] =>
  readdirSync(join(ROOT, folder), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && isSource(entry.name))
    .map((entry) => relative(ROOT, join(entry.parentPath, entry.name)).replaceAll('\\', '/'))
    .sort()

/** Types, exports and `import()` count as well as plain imports. */
export function importsOf(file: string): Import[] {
  const { importedFiles } = ts.preProcessFile(readFileSync(join(ROOT, file), 'utf8'))
  return importedFiles.map(({ fileName: specifier }) => ({
    from: file,
    specifier,
    to: resolveImport(file, specifier),
  }))
}

function resolveImport(from: string, specifier: string): string | null {
  if (specifier.startsWith('#')) return withExtension(specifier.slice(1))
  if (specifier.startsWith('@/')) return withExtension(posix.join('src', specifier.slice(2)))
  if (specifier.startsWith('.')) return withExtension(posix.join(dirname(from), specifier))
  return null
}

/** What Vite resolves with a query (`?url`) or as another kind of file keeps its name. */
function withExtension(path: string): string {
  const plain = path.split('?', 1)[0] ?? path
  const found = ['.ts', '.tsx', ''].find((end) => existsSync(join(ROOT, plain + end)))
  if (found === undefined) throw new Error(`No file for the import ${path}.`)
  return plain + found
}
