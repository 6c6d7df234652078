import { useTranslation } from 'react-i18next'
import type { EndProblem } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import { printAngle } from '#shared/units/angle'
import { printSlope } from '#shared/units/print-slope'
import { useUnits } from '@/features/people/useUnits'
import type { DraftEnd, DraftEnds, DraftHands, DraftPlane } from './model/draft-end'

/** A measure that is still to be typed. */
const OPEN = '?'

const inDegrees = (angle: number | null): string => (angle === null ? OPEN : printAngle(angle))

/** What ends, hands and their problems are called. Ends that are complete are taken too. */
export function useEndWords() {
  const { t } = useTranslation('ends')
  const { size } = useUnits()
  const inches = (length: number | null) => (length === null ? OPEN : size(length))

  const plane = (cut: DraftPlane): string => {
    if ('plumb' in cut) {
      return t('words.plumb', { slope: cut.plumb === null ? OPEN : printSlope(cut.plumb) })
    }
    if ('normal' in cut) return t('words.free')
    const { plan } = cut.corner
    return t('words.corner', { angle: inDegrees(plan === null ? null : Math.abs(plan)) })
  }

  const tabs = ({ tabs: all }: DraftEnd): string => {
    const [first] = all
    if (!first) return ''
    const alike = all.every(({ length }) => length === first.length)
    return ` + ${t('words.tabs', {
      count: all.length,
      length: alike ? inches(first.length) : t('words.lengths'),
    })}`
  }

  const end = (dressed: DraftEnd): string => {
    switch (dressed.kind) {
      case 'square':
        return t('words.square') + tabs(dressed)
      case 'lap':
        return t(`words.lap.${dressed.side}`, { length: inches(dressed.length) }) + tabs(dressed)
      case 'miter':
        return t('words.miter', { cut: plane(dressed.plane) }) + tabs(dressed)
    }
  }

  return {
    end,
    plane,
    side: (side: Side): string => t(`side.${side}`),
    hand: (hand: Side): string => t(`hand.${hand}`),
    /** The letter on label and head. */
    letter: (hand: Side): string => t(`letter.${hand}`),
    /** `Left: square · Right: miter …`; null is square and level. */
    ends: (ends: DraftEnds | null): string =>
      ends === null
        ? t('words.bothSquare')
        : `${t('words.left', { end: end(ends.left) })} · ${t('words.right', { end: end(ends.right) })}`,
    run: (lowEnd: Side | null): string =>
      lowEnd === null ? t('words.level') : t(`words.low.${lowEnd}`),
    /** `3 L · 3 R`, `6 L`; empty without hands. */
    hands: (hands: DraftHands | null): string =>
      hands === null
        ? ''
        : (['left', 'right'] as const)
            .filter((hand) => hands[hand] !== 0)
            .map((hand) => `${hands[hand] ?? OPEN} ${t(`letter.${hand}`)}`)
            .join(' · '),
    handsSpoken: (hands: DraftHands): string =>
      (['left', 'right'] as const)
        .filter((hand) => hands[hand] !== 0)
        .map((hand) => t(`words.hands.${hand}`, { count: hands[hand] ?? 0 }))
        .join(', '),
    problem: ({ code, end: side, leg, found, limit }: EndProblem): string => {
      const measure = (value: number | null) => {
        if (value === null) return ''
        switch (code) {
          case 'lapLongerThanPiece':
          case 'tabLongerThanPiece':
          case 'endsMeet':
            return size(value)
          case 'planeAlongPiece':
          case 'cornerTurnsBack':
            return printAngle(value)
          default:
            return String(value)
        }
      }
      const what = t(`problem.${code}`, {
        leg: leg ?? '',
        found: measure(found),
        limit: measure(limit),
      })
      return t('problem.at', { side: t(`side.${side}`), what })
    },
  }
}
