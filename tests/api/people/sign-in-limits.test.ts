import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { TRIES_PER_ACCOUNT, TRIES_PER_ADDRESS } from '#server/features/people/sign-in-limits'
import type { ApiAgent } from '../../support/api-agent'
import { startApi, type Api } from '../../support/api-app'
import { PASSWORD } from '../../support/factories'
import { FakeClock } from '../../support/fake-clock'

const QUARTER_HOUR = 15 * 60_000

let clock: FakeClock
let api: Api
beforeEach(async () => {
  clock = new FakeClock(new Date())
  api = await startApi({ clock })
})
afterEach(() => api.close())

/** One after the other: a page is one browser with one session. */
async function failToSignIn(agent: ApiAgent, email: string, times: number): Promise<number[]> {
  const statuses: number[] = []
  for (let i = 0; i < times; i++) statuses.push((await agent.signIn(email, 'wrong')).status)
  return statuses
}

describe('failed sign-ins', () => {
  it('close an account for a quarter of an hour, to the right password as well', async () => {
    const { email } = await api.make.person('counter')
    const agent = api.newAgent()
    const statuses = await failToSignIn(agent, email, TRIES_PER_ACCOUNT)
    expect(new Set(statuses)).toEqual(new Set([401]))

    const refused = await agent.signIn(email, PASSWORD)
    expect(refused.status).toBe(429)
    expect(refused.problem()).toMatchObject({ code: 'too-many-requests' })
    expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(0)

    clock.moveBy(QUARTER_HOUR)
    expect((await agent.signIn(email, PASSWORD)).status).toBe(200)
  })

  it('are counted by all processes together', async () => {
    const second = await startApi({ sharing: api, clock })
    try {
      const { email } = await api.make.person('counter')
      await failToSignIn(api.newAgent(), email, TRIES_PER_ACCOUNT - 1)
      expect(await failToSignIn(second.newAgent(), email, 2)).toEqual([401, 429])
      expect((await api.newAgent().signIn(email, PASSWORD)).status).toBe(429)
    } finally {
      await second.close()
    }
  })

  it('leave other accounts open', async () => {
    const [one, other] = [await api.make.person('counter'), await api.make.person('counter')]
    await failToSignIn(api.newAgent(), one.email, TRIES_PER_ACCOUNT + 1)
    expect((await api.newAgent().signIn(other.email, PASSWORD)).status).toBe(200)
  })

  it('close an address after many tries, whichever accounts were tried', async () => {
    const agents = Array.from({ length: TRIES_PER_ADDRESS }, (_, i) =>
      failToSignIn(api.newAgent(), `guess-${i}@example.com`, 1),
    )
    expect(new Set((await Promise.all(agents)).flat())).toEqual(new Set([401]))
    const { email } = await api.make.person('counter')
    expect((await api.newAgent().signIn(email, PASSWORD)).status).toBe(429)
  })
})

it('successful sign-ins are not counted', async () => {
  const { email } = await api.make.person('counter')
  const statuses: number[] = []
  for (let i = 0; i < TRIES_PER_ACCOUNT + 2; i++) {
    statuses.push((await api.newAgent().signIn(email, PASSWORD)).status)
  }
  expect(new Set(statuses)).toEqual(new Set([200]))
})
