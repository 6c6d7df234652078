import { chmodSync, statSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import {
  findBarringFolder,
  mayEnter,
  parseAccount,
} from '../../../server/launch/postgres/account.mjs'
import { findPrograms } from '../../../server/launch/postgres/programs.mjs'
import { cloneName, stateFolderCandidates } from '../../../server/launch/postgres/state-folder.mjs'
import { temporaryFolder } from './temporary-folder'

const NAMES = ['initdb', 'pg_ctl', 'postgres', 'psql']
const programs = (folder: string, names = NAMES) =>
  Object.fromEntries(names.map((name) => [`${folder}/${name}`, '']))

describe('the programs of PostgreSQL', () => {
  it('are the newest complete ones of Debian', () => {
    const debianFolder = temporaryFolder({
      ...programs('9/bin'),
      ...programs('15/bin'),
      ...programs('17/bin', ['psql']),
      'common/bin/psql': '',
    })
    const bin = join(debianFolder, '15/bin')
    expect(findPrograms({ debianFolder, path: '' })).toEqual({ bin, major: 15 })
  })

  it("are of an existing cluster's own major version", () => {
    const debianFolder = temporaryFolder({ ...programs('15/bin'), ...programs('17/bin') })
    expect(findPrograms({ major: 15, debianFolder, path: '' })?.major).toBe(15)
    expect(findPrograms({ major: 16, debianFolder, path: '' })).toBeUndefined()
  })

  it('are those in PATH where Debian has none', () => {
    const folder = temporaryFolder(programs('bin'))
    const path = `/not-there:${join(folder, 'bin')}`
    expect(findPrograms({ debianFolder: join(folder, 'none'), path })).toEqual({
      bin: join(folder, 'bin'),
      major: undefined,
    })
  })
})

describe("the server's account", () => {
  const passwd =
    'root:x:0:0:root:/root:/bin/bash\npostgres:x:101:104:PostgreSQL:/var/lib:/bin/bash\n'

  it('is read from the list of accounts', () => {
    expect(parseAccount(passwd, 'postgres')).toEqual({ uid: 101, gid: 104 })
    expect(parseAccount(passwd, 'post')).toBeUndefined()
  })

  it.each([
    [0o700, 101, 0, true],
    [0o077, 101, 104, false],
    [0o710, 0, 104, true],
    [0o701, 0, 104, false],
    [0o701, 0, 0, true],
    [0o776, 0, 0, false],
  ])('by mode %o of owner %i, group %i may enter: %s', (mode, uid, gid, expected) => {
    expect(mayEnter({ mode, uid, gid }, { uid: 101, gid: 104 })).toBe(expected)
  })

  it('is told which folder bars it', () => {
    const folder = temporaryFolder({ 'open/closed/data/x': '' })
    const stranger = { uid: statSync(folder).uid + 1, gid: statSync(folder).gid + 1 }
    for (const path of ['', 'open', 'open/closed/data']) chmodSync(join(folder, path), 0o755)
    chmodSync(join(folder, 'open/closed'), 0o700)
    expect(findBarringFolder(join(folder, 'open'), stranger)).toBeUndefined()
    expect(findBarringFolder(join(folder, 'open/closed/data'), stranger)).toBe(
      join(folder, 'open/closed'),
    )
  })
})

describe("the database's folder", () => {
  it('is named after the clone and tells clones of one name apart', () => {
    expect(cloneName('/home/a/foldyard')).toMatch(/^foldyard-[0-9a-f]{8}$/)
    expect(cloneName('/home/a/foldyard')).not.toBe(cloneName('/home/b/foldyard'))
    expect(cloneName('/srv/my shop')).toMatch(/^my_shop-/)
  })

  it('lies outside the repository when it can', () => {
    const person = { home: '/home/a', stateHome: undefined, temporary: '/tmp' }
    const first = (uid: number, stateHome?: string) =>
      stateFolderCandidates({ ...person, uid, stateHome })[0]
    expect(first(0)).toBe('/var/lib/foldyard')
    expect(first(1000)).toBe('/home/a/.local/state/foldyard')
    expect(first(1000, '/state')).toBe('/state/foldyard')
  })
})
