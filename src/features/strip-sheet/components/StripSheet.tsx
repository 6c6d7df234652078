import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import { SQUARE_ENDS } from '#shared/ends/strip-borders'
import { LIFT_RULE, liftOf } from '#shared/bundles/lift-rule'
import { foldedSection } from '#shared/strip/folded-section'
import { sectionMeasures } from '#shared/strip/section-measures'
import { Choice } from '@/components/Choice'
import { Notice } from '@/components/Notice'
import { ProfilePair } from '@/features/drawing/figure/ProfilePair'
import { useEndWords } from '@/features/ends/useEndWords'
import { StockName } from '@/features/orders/components/StockName'
import { useUnits } from '@/features/people/useUnits'
import { countOf, dressedPiece, handsMade, type SheetLine } from '../sheet-line'
import { EndSection } from './EndSection'
import { OutlineFigure } from './OutlineFigure'
import { SheetFiles, type SheetLinks } from './SheetFiles'

interface Props {
  readonly line: SheetLine
  /** Where the sheet's files are, for a hand. */
  readonly links: (hand: Side | null) => SheetLinks
}

const WIDTH = 520
const HEIGHT = 420

type Fact = readonly [label: string, value: string]

/** Everything the shop needs to cut and mark a line's strips, on one page. */
export function StripSheet({ line, links }: Props) {
  const { t } = useTranslation('strip-sheet')
  const { size, run, weight } = useUnits()
  const endWords = useEndWords()
  const made = handsMade(line.hands)
  const [chosen, setChosen] = useState<Side | null>(null)
  const hand = chosen ?? line.hands?.drawn ?? null
  const shown = hand !== null && made.length > 0 && !made.includes(hand) ? (made[0] ?? null) : hand
  const piece = dressedPiece(line, shown)
  const { strip, stock, profile } = line
  const layout = piece.laid.ok ? piece.laid.layout : null
  const ends = piece.ends ?? SQUARE_ENDS
  const folded = layout && sectionMeasures(foldedSection(profile, stock.sheet)).box
  const facts: Fact[] = [
    [t('fact.pieces'), String(countOf(line, shown))],
    [t('fact.length'), run(line.length)],
    [t('fact.strip'), size(strip.stripWidth, 32)],
    [t('fact.girth'), size(strip.girth)],
    ...(layout ? [[t('fact.blank'), run(layout.blankLength)] as const] : []),
    ...(piece.weight === null ? [] : [[t('fact.weight'), weight(piece.weight)] as const]),
    ...(folded ? [[t('fact.box'), `${size(folded.width)} × ${size(folded.height)}`] as const] : []),
    [t('fact.color'), t(`color.${profile.colorSide}`)],
  ]
  const lift = piece.weight === null ? null : liftOf({ weight: piece.weight, longest: line.length })

  return (
    <div className="flex flex-col gap-6">
      {made.length > 1 && (
        <Choice
          legend={t('hand.legend')}
          value={shown ?? 'left'}
          options={made.map((value) => ({
            value,
            label: t(`hand.${value}`, { count: countOf(line, value) }),
          }))}
          onChange={setChosen}
        />
      )}
      <div className="grid gap-x-10 gap-y-4 lg:grid-cols-[32.5rem_minmax(0,26rem)]">
        <ProfilePair
          profile={profile}
          stock={stock}
          strip={strip}
          name={line.name}
          width={WIDTH}
          height={HEIGHT}
          stripMode="layout"
        />
        <div className="flex flex-col gap-3">
          {shown !== null && <p className="text-title font-bold">{t(`hand.big.${shown}`)}</p>}
          <StockName stock={stock} />
          <dl>
            {facts.map(([label, value]) => (
              <div key={label} className="flex justify-between gap-4 border-b border-rule py-1">
                <dt className="text-scribe">{label}</dt>
                <dd className="font-figure">{value}</dd>
              </div>
            ))}
          </dl>
          <SheetFiles {...links(shown)} />
        </div>
      </div>
      {!piece.laid.ok &&
        piece.laid.problems.map((problem, index) => (
          <Notice key={index} kind="error">
            {endWords.problem(problem)}
          </Notice>
        ))}
      {layout && (
        <>
          <section className="flex flex-col gap-3 border-t-2 border-ink pt-3">
            <h2 className="font-bold">{t('whole')}</h2>
            <OutlineFigure layout={layout} strip={strip} lowEnd={ends.lowEnd} name={line.name} />
          </section>
          {(['left', 'right'] as const).map((side) => (
            <EndSection
              key={side}
              side={side}
              end={ends[side]}
              layout={layout}
              strip={strip}
              name={line.name}
              lowEnd={ends.lowEnd}
            />
          ))}
        </>
      )}
      <aside
        aria-label={t('caution.title')}
        className="flex max-w-prose flex-col gap-1 border-l-4 border-ochre pl-4 text-small"
      >
        <p>{t('caution.edges')}</p>
        <p>{t('caution.brake')}</p>
        {lift !== null && lift !== 'onePerson' && (
          <p>
            {t(`caution.${lift}`, {
              weight: weight(LIFT_RULE.onePersonWeight),
              never: weight(LIFT_RULE.neverOneWeight),
              length: run(LIFT_RULE.onePersonLength),
            })}
          </p>
        )}
        {(profile.hemA ?? profile.hemB) !== null && <p>{t('caution.film')}</p>}
      </aside>
    </div>
  )
}
