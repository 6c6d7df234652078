import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { newCode } from '#server/features/pieces/new-code'
import { resolveCode } from '#shared/pieces/lookup.contract'
import { firstCode, openFloor, type Floor } from '../../support/making-factories'

let floor: Floor
beforeAll(async () => {
  floor = await openFloor()
})
afterAll(() => floor.close())

const resolve = (code: string) => floor.counter.call(resolveCode, { params: { code } })

describe('A scanned code', () => {
  it('leads to its piece, bundle or run', async () => {
    const { order, bundle } = await floor.bundled()
    const code = firstCode(order)
    const [runId = ''] = await floor.runIds(order)
    const run = await floor.readRun(runId)
    expect(await resolve(code)).toEqual({
      kind: 'piece',
      code,
      state: 'bundled',
      runId,
      orderId: order.id,
    })
    expect(await resolve(bundle.code)).toEqual({
      kind: 'bundle',
      code: bundle.code,
      bundleId: bundle.id,
      orderId: order.id,
    })
    expect(await resolve(run.code)).toEqual({ kind: 'run', code: run.code, runId })
  })

  it('may be typed by hand', async () => {
    const code = firstCode(await floor.queue())
    const typed = `${code.slice(0, 4)} ${code.slice(4)}`.toLowerCase().replace(/0/g, 'o')
    expect(await resolve(typed)).toMatchObject({ kind: 'piece', code })
  })

  it.each(['piece', 'bundle', 'run'] as const)(
    'of a %s that was never printed is not found, and says which',
    async (kind) => {
      const answer = await floor.counter.get(`/codes/${newCode(kind)}`)
      expect(answer.status).toBe(404)
      expect(answer.problem().detail).toContain(`no such ${kind}`)
    },
  )

  it('with a wrong character is refused with the cure', async () => {
    const code = firstCode(await floor.queue())
    const wrong = code.slice(0, 2) + (code[2] === '7' ? '8' : '7') + code.slice(3)
    const answer = await floor.counter.get(`/codes/${wrong}`)
    expect(answer.status).toBe(400)
    expect(answer.problem().errors).toEqual([
      { path: 'code', message: 'One character is wrong: compare it with the label.' },
    ])
  })
})
