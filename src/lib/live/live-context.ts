import { createContext, useContext } from 'react'
import type { LiveState } from '@/lib/live/useLive'

export const LiveContext = createContext<LiveState>('off')

export const useLiveState = (): LiveState => useContext(LiveContext)
