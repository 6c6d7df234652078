import { act, renderHook } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { forgetPlanProgress, hearPlanProgress, usePlanProgress } from '@/lib/live/plan-progress'

const told = (key: string, nodes: number) => JSON.stringify({ key, nodes, elapsed: 900 })

describe('how far a long plan has come', () => {
  it('is told to whoever asked under its key, and to nobody else', () => {
    const mine = renderHook(() => usePlanProgress('mine'))
    const other = renderHook(() => usePlanProgress('other'))
    act(() => hearPlanProgress(told('mine', 1200)))
    expect(mine.result.current?.nodes).toBe(1200)
    expect(other.result.current).toBeNull()
    act(() => hearPlanProgress(told('mine', 5400)))
    expect(mine.result.current?.nodes).toBe(5400)
  })

  it('is over with the answer', () => {
    const { result } = renderHook(() => usePlanProgress('done'))
    act(() => hearPlanProgress(told('done', 10)))
    act(() => forgetPlanProgress('done'))
    expect(result.current).toBeNull()
  })

  it('refuses what is no progress', () => {
    expect(() => hearPlanProgress('{"key":1}')).toThrow()
  })
})
