import { useRef, type KeyboardEvent, type PointerEvent } from 'react'
import { useTranslation } from 'react-i18next'
import { tickAt, tickText, TICKS } from '@/components/keypad/keypad-model'

interface Props {
  /** 0…15, the tick that is chosen. */
  readonly value: number
  readonly onChange: (sixteenths: number) => void
}

const STEPS: Record<string, number> = {
  ArrowRight: 1,
  ArrowUp: 1,
  ArrowLeft: -1,
  ArrowDown: -1,
  PageUp: 2,
  PageDown: -2,
}

const NUMBERS = Array.from({ length: TICKS }, (_, sixteenths) => sixteenths)

/** Long ticks for the half, shorter for quarters, eighths and sixteenths, as on any tape. */
function tickHeight(sixteenths: number): number {
  if (sixteenths % 16 === 0) return 100
  if (sixteenths % 8 === 0) return 56
  if (sixteenths % 4 === 0) return 44
  return sixteenths % 2 === 0 ? 32 : 18
}

/**
 * One inch of a tape, drawn to be touched: press a tick, or slide until the fraction above reads
 * right. Arrow keys go by sixteenths. Eighths and coarser are written under their ticks.
 */
export function Tape({ value, onChange }: Props) {
  const { t } = useTranslation('components')
  const tape = useRef<HTMLDivElement>(null)

  function touch(event: PointerEvent) {
    const box = tape.current?.getBoundingClientRect()
    if (!box || box.width === 0) return
    const next = tickAt(event.clientX - box.left, box.width)
    if (next !== value) onChange(next)
  }

  function onKeyDown(event: KeyboardEvent) {
    const step = STEPS[event.key]
    const next = event.key === 'Home' ? 0 : event.key === 'End' ? TICKS - 1 : value + (step ?? 0)
    if (step === undefined && event.key !== 'Home' && event.key !== 'End') return
    event.preventDefault()
    if (next >= 0 && next < TICKS && next !== value) onChange(next)
  }

  return (
    <div
      ref={tape}
      role="slider"
      tabIndex={0}
      aria-label={t('keypad.tape')}
      aria-valuemin={0}
      aria-valuemax={TICKS - 1}
      aria-valuenow={value}
      aria-valuetext={value === 0 ? t('keypad.noFraction') : tickText(value)}
      className="tape"
      onKeyDown={onKeyDown}
      onPointerDown={(event) => {
        event.currentTarget.setPointerCapture(event.pointerId)
        touch(event)
      }}
      onPointerMove={(event) => {
        if (event.currentTarget.hasPointerCapture(event.pointerId)) touch(event)
      }}
    >
      {NUMBERS.map((sixteenths) => (
        <span
          key={sixteenths}
          className="tape-cell"
          data-tick={sixteenths}
          data-chosen={sixteenths === value || undefined}
        >
          <span className="tape-tick" style={{ height: `${tickHeight(sixteenths)}%` }} />
          {sixteenths % 2 === 0 && (
            <span className="tape-word" style={{ top: `${tickHeight(sixteenths)}%` }}>
              {sixteenths === 0 ? '0' : tickText(sixteenths)}
            </span>
          )}
        </span>
      ))}
    </div>
  )
}
