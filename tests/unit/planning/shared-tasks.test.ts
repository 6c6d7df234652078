import { describe, expect, it } from 'vitest'
import { SharedTasks } from '#server/planning/shared-tasks'

/** Tasks that end when the test says so. */
function openTasks() {
  const shared = new SharedTasks<string>()
  const started: { signal: AbortSignal; onNodes: (nodes: number) => void }[] = []
  const ends: PromiseWithResolvers<string>[] = []
  const ask = (key: string, signal?: AbortSignal, onNodes?: (nodes: number) => void) =>
    shared.join(
      key,
      { ...(signal && { signal }), ...(onNodes && { onNodes }) },
      (taskSignal, tell) => {
        const end = withResolvers<string>()
        ends.push(end)
        started.push({ signal: taskSignal, onNodes: tell })
        return end.promise
      },
    )
  return { ask, started, ends }
}

interface PromiseWithResolvers<Value> {
  readonly promise: Promise<Value>
  readonly resolve: (value: Value) => void
  readonly reject: (error: Error) => void
}

function withResolvers<Value>(): PromiseWithResolvers<Value> {
  let settle: Omit<PromiseWithResolvers<Value>, 'promise'> | undefined
  const promise = new Promise<Value>((resolve, reject) => {
    settle = { resolve, reject }
  })
  if (!settle) throw new Error('A promise runs its executor at once.')
  return { promise, ...settle }
}

describe('A task that several ask for', () => {
  it('is done once, and each gets its value', async () => {
    const { ask, started, ends } = openTasks()
    const both = [ask('a', new AbortController().signal), ask('a')]
    ends[0]?.resolve('plan')
    expect(await Promise.all(both)).toEqual(['plan', 'plan'])
    expect(started).toHaveLength(1)
  })

  it('is not the one of another key', async () => {
    const { ask, ends } = openTasks()
    const both = [ask('a'), ask('b')]
    ends[1]?.resolve('second')
    ends[0]?.resolve('first')
    expect(await Promise.all(both)).toEqual(['first', 'second'])
  })

  it('goes on when one of them goes, who is told at once', async () => {
    const { ask, started, ends } = openTasks()
    const leaving = new AbortController()
    const stays = ask('a', new AbortController().signal)
    const goes = ask('a', leaving.signal)
    leaving.abort(new Error('closed the page'))
    await expect(goes).rejects.toThrow('closed the page')
    expect(started[0]?.signal.aborted).toBe(false)
    ends[0]?.resolve('plan')
    expect(await stays).toBe('plan')
  })

  it('is given up when the last one goes, and begins anew for the next', async () => {
    const { ask, started, ends } = openTasks()
    const leaving = new AbortController()
    const gone = [ask('a', leaving.signal), ask('a', leaving.signal)]
    leaving.abort(new Error('closed the page'))
    for (const each of gone) await expect(each).rejects.toThrow('closed the page')
    expect(started[0]?.signal.aborted).toBe(true)

    const next = ask('a')
    expect(started).toHaveLength(2)
    // The end of the first one, however late, is not the end of the second.
    ends[0]?.reject(new Error('given up'))
    const joined = ask('a')
    expect(started).toHaveLength(2)
    ends[1]?.resolve('plan')
    expect(await Promise.all([next, joined])).toEqual(['plan', 'plan'])
  })

  it('begins anew once it has ended', async () => {
    const { ask, started, ends } = openTasks()
    const first = ask('a')
    ends[0]?.reject(new Error('failed'))
    await expect(first).rejects.toThrow('failed')
    const second = ask('a')
    ends[1]?.resolve('plan')
    expect(await second).toBe('plan')
    expect(started).toHaveLength(2)
  })

  it('tells all who wait how far it is, and nobody who has gone', async () => {
    const { ask, started, ends } = openTasks()
    const leaving = new AbortController()
    const heard: string[] = []
    const goes = ask('a', leaving.signal, (nodes) => heard.push(`leaving ${nodes}`))
    const stays = ask('a', new AbortController().signal, (nodes) => heard.push(`staying ${nodes}`))
    started[0]?.onNodes(1)
    leaving.abort(new Error('closed the page'))
    await expect(goes).rejects.toThrow('closed the page')
    started[0]?.onNodes(2)
    ends[0]?.resolve('plan')
    await stays
    expect(heard).toEqual(['leaving 1', 'staying 1', 'staying 2'])
  })

  it('is not begun for somebody who has gone already', async () => {
    const { ask, started } = openTasks()
    await expect(ask('a', AbortSignal.abort(new Error('gone before')))).rejects.toThrow(
      'gone before',
    )
    expect(started).toEqual([])
  })
})
