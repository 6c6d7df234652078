import { useCallback, useEffect, useRef } from 'react'
import { isMuted } from '@/lib/device/sound'

export type Beep = 'done' | 'wrong'

/** Hertz, one after another: rising for done, low and twice for wrong; told apart without looking. */
const TONES: Record<Beep, readonly number[]> = { done: [660, 990], wrong: [220, 220] }

const TONE_SECONDS = 0.09
const GAP_SECONDS = 0.03
const LOUDNESS = 0.2
const LATE_MS = 300

function play(context: AudioContext, beep: Beep): void {
  TONES[beep].forEach((hertz, index) => {
    const start = context.currentTime + index * (TONE_SECONDS + GAP_SECONDS)
    const end = start + TONE_SECONDS
    const oscillator = new OscillatorNode(context, { frequency: hertz, type: 'triangle' })
    const gain = new GainNode(context, { gain: 0 })
    // Ramps at both ends, for a tone that is switched hard begins and ends with a crack.
    gain.gain.setValueAtTime(0, start)
    gain.gain.linearRampToValueAtTime(LOUDNESS, start + 0.01)
    gain.gain.setValueAtTime(LOUDNESS, end - 0.015)
    gain.gain.linearRampToValueAtTime(0, end)
    oscillator.connect(gain).connect(context.destination)
    oscillator.start(start)
    oscillator.stop(end)
  })
}

/**
 * The answer to a scan, heard. Browsers give sound only after the first press on the page; until
 * then, where there is no audio, and where the device is muted, the band on screen speaks alone.
 */
export function useBeep(): (beep: Beep) => void {
  const context = useRef<AudioContext | null>(null)

  useEffect(
    () => () => {
      void context.current?.close()
      context.current = null
    },
    [],
  )

  return useCallback((beep: Beep) => {
    if (isMuted() || typeof AudioContext === 'undefined') return
    context.current ??= new AudioContext()
    const audio = context.current
    if (audio.state === 'running') return play(audio, beep)
    const asked = performance.now()
    // Before the first press `resume` waits for one: a beep that late would answer another scan.
    void audio.resume().then(() => {
      if (performance.now() - asked < LATE_MS) play(audio, beep)
    })
  }, [])
}
