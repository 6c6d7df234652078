import { QueryClientProvider } from '@tanstack/react-query'
import { act, renderHook } from '@testing-library/react'
import type { ReactNode } from 'react'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { createQueryClient } from '@/app/query-client'
import { useLive } from '@/lib/live/useLive'
import { fakeEventSource } from '../../support/fake-event-source'

const KEYS = [['jobs'], ['orders', 'list'], ['runs'], ['rack'], ['pieces', 'P1'], ['stocks']]

function follow(on = true) {
  const client = createQueryClient()
  for (const key of KEYS) client.setQueryData(key, 'read')
  const live = fakeEventSource()
  const wrapper = ({ children }: { children: ReactNode }) => (
    <QueryClientProvider client={client}>{children}</QueryClientProvider>
  )
  const hook = renderHook(({ on }) => useLive(on), { wrapper, initialProps: { on } })
  const stale = () =>
    KEYS.filter((key) => client.getQueryState(key)?.isInvalidated).map(([root]) => root)
  return { ...hook, live, stale }
}

beforeEach(() => vi.useFakeTimers())
afterEach(() => vi.useRealTimers())

describe('live events', () => {
  it('show whether the screen follows the shop', () => {
    const { result, live } = follow()
    expect(result.current).toBe('reconnecting')
    act(() => live.last().open())
    expect(result.current).toBe('live')
    act(() => live.last().fail({ refused: false }))
    expect(result.current).toBe('reconnecting')
  })

  it('make stale what the topic concerns, and nothing else', () => {
    const { live, stale } = follow()
    act(() => live.last().open())
    act(() => live.last().send({ topic: 'stocks', entityId: null }))
    expect(stale()).toEqual(['orders', 'stocks'])
  })

  it('of a piece reach its order, its run and the rack', () => {
    const { live, stale } = follow()
    act(() => live.last().open())
    act(() => live.last().send({ topic: 'pieces', entityId: 'P1' }))
    expect(stale()).toEqual(['orders', 'runs', 'rack', 'pieces'])
  })

  it('make everything stale after a reset, and when they speak of the unknown', () => {
    const first = follow()
    act(() => first.live.last().reset())
    expect(first.stale()).toHaveLength(KEYS.length)
    first.unmount()

    const second = follow()
    act(() => second.live.last().send({ topic: 'weather' }))
    expect(second.stale()).toHaveLength(KEYS.length)
  })

  it('leave reconnecting to the browser while it tries by itself', () => {
    const { live } = follow()
    act(() => live.last().open())
    act(() => live.last().fail({ refused: false }))
    act(() => void vi.advanceTimersByTime(60_000))
    expect(live.all()).toHaveLength(1)
  })

  it('are followed anew where the browser gave up, and all is read again', () => {
    const { result, live, stale } = follow()
    act(() => live.last().open())
    act(() => live.last().fail({ refused: true }))
    act(() => void vi.advanceTimersByTime(10_000))
    expect(live.all()).toHaveLength(2)
    expect(stale()).toEqual([])
    act(() => live.last().open())
    expect(result.current).toBe('live')
    expect(stale()).toHaveLength(KEYS.length)
  })

  it('end with the session', () => {
    const { result, rerender, live } = follow()
    act(() => live.last().open())
    rerender({ on: false })
    expect(result.current).toBe('off')
    expect(live.last().readyState).toBe(2)
  })

  it('are not asked for without a session', () => {
    const { live } = follow(false)
    expect(live.all()).toEqual([])
  })
})
