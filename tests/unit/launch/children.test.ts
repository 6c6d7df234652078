import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { readdirSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { noteChild, trackChildren } from '../../../server/launch/process/children.mjs'
import { temporaryFolder } from './temporary-folder'

describe('children of a launcher', () => {
  it('are noted while they run, once tracking has begun', async () => {
    const folder = temporaryFolder()
    noteChild(process.pid)
    expect(readdirSync(folder)).toEqual([])
    const endTracking = await trackChildren(folder)
    const forget = noteChild(process.pid)
    expect(readdirSync(folder)).toEqual([expect.stringMatching(`^${process.pid}-`)])
    forget()
    expect(readdirSync(folder)).toEqual([])
    endTracking()
  })

  it('of a dead launcher are waited for', async () => {
    const folder = temporaryFolder({ '4194305-1': '' })
    const child = spawn('cat')
    const endTracking = await trackChildren(folder)
    noteChild(child.pid)
    endTracking()
    const events: string[] = []
    const exit = once(child, 'exit').then(() => events.push('child ended'))
    const next = trackChildren(folder, (pid) => events.push(`waiting for ${pid}`)).then((end) => {
      events.push('next began')
      end()
    })
    child.stdin.end()
    await Promise.all([exit, next])
    expect(events).toEqual([`waiting for ${child.pid}`, 'child ended', 'next began'])
    expect(readdirSync(folder)).toEqual([])
  })
})
