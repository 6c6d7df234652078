import { useId } from 'react'
import { useTranslation } from 'react-i18next'
import type { EndLayout, StripLayout } from '#shared/ends/end-layout'
import type { End, Side } from '#shared/ends/end.schema'
import type { Strip } from '#shared/strip/strip.schema'
import { EndMarks } from '@/features/ends/components/EndMarks'
import { useEndWords } from '@/features/ends/useEndWords'
import { useUnits } from '@/features/people/useUnits'
import { OutlineFigure } from './OutlineFigure'

interface Props {
  readonly side: Side
  readonly end: End
  readonly layout: StripLayout
  readonly strip: Strip
  readonly name: string
  /** The end that lies lower on the roof; null where the piece runs level. */
  readonly lowEnd: Side | null
}

/** What has to be done to an end besides its cut. */
function EndNotes({ end }: { readonly end: EndLayout }) {
  const { t } = useTranslation('strip-sheet')
  const { size } = useUnits()
  const notes = [
    ...end.tabs.map(({ leg, length }) => t('end.tab', { leg, length: size(length) })),
    ...end.openings.map(({ edge, length, gap }) =>
      t('end.opening', { edge, length: size(length), gap: size(gap, 32) }),
    ),
    ...(end.slits.length > 0 ? [t('end.slits', { count: end.slits.length })] : []),
  ]
  return notes.length === 0 ? null : (
    <ul className="list-disc pl-5">
      {notes.map((note) => (
        <li key={note}>{note}</li>
      ))}
    </ul>
  )
}

/** One end: how it is dressed, its outline and its marking table. A square end says so and no more. */
export function EndSection({ side, end, layout, strip, name, lowEnd }: Props) {
  const { t } = useTranslation('strip-sheet')
  const words = useEndWords()
  const id = useId()
  const laid = layout[side]
  const plain = end.kind === 'square' && end.tabs.length === 0
  const title = t(`end.${side}`)
  return (
    <section aria-labelledby={id} className="flex flex-col gap-3 border-t-2 border-ink pt-3">
      <h2 id={id} className="font-bold">
        {title}
        {lowEnd !== null && (
          <span className="font-normal"> · {t(lowEnd === side ? 'end.low' : 'end.high')}</span>
        )}
      </h2>
      <p>
        <span className="font-semibold">{words.end(end)}.</span>{' '}
        {t(`end.kind.${end.kind === 'lap' ? end.side : end.kind}`)}
      </p>
      {!plain && (
        <div className="grid items-start gap-x-10 gap-y-4 lg:grid-cols-[22.5rem_minmax(0,28rem)]">
          <OutlineFigure
            layout={layout}
            strip={strip}
            side={side}
            lowEnd={lowEnd}
            name={`${name}, ${title}`}
          />
          <div className="flex flex-col gap-3">
            <EndMarks end={laid} strip={strip} />
            <EndNotes end={laid} />
          </div>
        </div>
      )}
    </section>
  )
}
