import { QueryClientProvider } from '@tanstack/react-query'
import { act, renderHook } from '@testing-library/react'
import type { ReactNode } from 'react'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { createQueryClient } from '@/app/query-client'
import { ApiProblem, OfflineError } from '@/lib/api/api-errors'
import { newKey } from '@/lib/api/idempotency'
import { useIdempotentMutation } from '@/lib/api/useIdempotentMutation'

const offline = () => Promise.reject(new OfflineError(new TypeError('Failed to fetch')))
const refused = () =>
  Promise.reject(
    new ApiProblem({
      type: '/problems/invalid-input',
      title: 'Invalid',
      status: 400,
      detail: 'No.',
      code: 'invalid-input',
    }),
  )

type Send = (variables: string, key: string) => Promise<string>

function start(send: Send, oneKeyPer?: (variables: string) => string) {
  const client = createQueryClient()
  const wrapper = ({ children }: { children: ReactNode }) => (
    <QueryClientProvider client={client}>{children}</QueryClientProvider>
  )
  return renderHook(() => useIdempotentMutation({ send, oneKeyPer }), { wrapper }).result
}

/** Lets all waiting times pass, and what follows from each. */
const settle = () => act(() => vi.advanceTimersByTimeAsync(120_000))

beforeEach(() => vi.useFakeTimers())
afterEach(() => vi.useRealTimers())

const keysOf = (send: ReturnType<typeof vi.fn<Send>>) => send.mock.calls.map(([, key]) => key)

describe('a change that is made once', () => {
  it('is sent again under the same key when no answer came', async () => {
    const send = vi.fn<Send>().mockImplementationOnce(offline).mockImplementationOnce(offline)
    send.mockResolvedValue('made')
    const mutation = start(send)
    act(() => mutation.current.mutate('order'))
    await settle()
    expect(mutation.current.data).toBe('made')
    expect(send).toHaveBeenCalledTimes(3)
    expect(new Set(keysOf(send)).size).toBe(1)
  })

  it('keeps its key for the press of the person after the automatic tries', async () => {
    const send = vi.fn<Send>().mockImplementation(offline)
    const mutation = start(send)
    act(() => mutation.current.mutate('order'))
    await settle()
    expect(mutation.current.error).toBeInstanceOf(OfflineError)
    send.mockResolvedValue('made')
    act(() => mutation.current.mutate('order'))
    await settle()
    expect(mutation.current.data).toBe('made')
    expect(new Set(keysOf(send)).size).toBe(1)
  })

  it('is never sent again by itself after a refusal, and then has a new key', async () => {
    const send = vi.fn<Send>().mockImplementationOnce(refused).mockResolvedValue('made')
    const mutation = start(send)
    act(() => mutation.current.mutate('order'))
    await settle()
    expect(send).toHaveBeenCalledTimes(1)
    act(() => mutation.current.mutate('order, cured'))
    await settle()
    expect(new Set(keysOf(send)).size).toBe(2)
  })

  it('has a new key after it succeeded', async () => {
    const send = vi.fn<Send>().mockResolvedValue('made')
    const mutation = start(send)
    act(() => mutation.current.mutate('first'))
    await settle()
    act(() => mutation.current.mutate('second'))
    await settle()
    expect(new Set(keysOf(send)).size).toBe(2)
  })

  it('has a key for each thing scanned while others wait for their answer', async () => {
    const send = vi.fn<Send>().mockImplementation(offline)
    const mutation = start(send, (code) => code)
    act(() => mutation.current.mutate('P1'))
    await act(() => vi.advanceTimersByTimeAsync(10))
    act(() => mutation.current.mutate('P2'))
    await settle()
    const keysFor = (wanted: string) =>
      new Set(send.mock.calls.filter(([code]) => code === wanted).map(([, key]) => key))
    expect(keysFor('P1').size).toBe(1)
    expect(keysFor('P2').size).toBe(1)
    expect(new Set(keysOf(send)).size).toBe(2)
  })
})

describe('a key', () => {
  const UUID_4 = /^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/

  it('is a random UUID', () => {
    expect(newKey()).toMatch(UUID_4)
    expect(newKey()).not.toBe(newKey())
  })

  it('is one too where the page came over plain http', () => {
    vi.stubGlobal('crypto', { getRandomValues: crypto.getRandomValues.bind(crypto) })
    const keys = [newKey(), newKey()]
    vi.unstubAllGlobals()
    expect(keys[0]).toMatch(UUID_4)
    expect(keys[0]).not.toBe(keys[1])
  })
})
