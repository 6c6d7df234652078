import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import {
  clearDeadPostmaster,
  findPostmaster,
  parsePostmasterFile,
} from '../../../server/launch/postgres/postmaster.mjs'
import { existsSync } from 'node:fs'
import { temporaryFolder } from './temporary-folder'

// The lines that PostgreSQL 15 documents in src/include/utils/pidfile.h.
const pidFile = (pid: number, status: string) =>
  [pid, '/var/lib/x/data', 1790000000, 21306, '', '127.0.0.1', '  5432001   131072', status].join(
    '\n',
  )

describe('postmaster.pid', () => {
  it('tells process, port and readiness', () => {
    expect(parsePostmasterFile(pidFile(412, 'ready   '))).toEqual({
      pid: 412,
      port: 21306,
      isReady: true,
    })
  })

  it.each(['starting', 'stopping', 'standby '])('is not ready while %s', (status) => {
    expect(parsePostmasterFile(pidFile(412, status))).toMatchObject({ isReady: false })
  })

  it('may end early, while the server writes it', () => {
    expect(parsePostmasterFile('412\n/data\n')).toEqual({
      pid: 412,
      port: undefined,
      isReady: false,
    })
  })

  it.each(['', 'rubbish\n', '-412\n'])('is none when it reads %j', (text) => {
    expect(parsePostmasterFile(text)).toBeUndefined()
  })

  it('does not stand for a server when its number belongs to another program', async () => {
    const folder = temporaryFolder({ 'postmaster.pid': pidFile(process.pid, 'ready') })
    expect(findPostmaster(folder)).toBeUndefined()
    await clearDeadPostmaster(folder)
    expect(existsSync(join(folder, 'postmaster.pid'))).toBe(false)
  })
})
