import { kFactorFromTestBend } from '#shared/strip/calibrate-k-factor'
import { testBendInputSchema, type TestBendInput } from '#shared/stock/stock.contract'
import type { Degrees, Inches } from '#shared/units/brands'

/** A test bend as far as it is filled in; null is not filled in yet. Inches, degrees of bend. */
export interface TestBendDraft {
  readonly brakeId: string
  readonly stripWidth: Inches | null
  readonly legA: Inches | null
  readonly legB: Inches | null
  readonly turn: Degrees | null
  readonly thickness: Inches | null
  readonly insideRadius: Inches | null
  readonly note: string
}

export const emptyTestBend = (brakeId: string, thickness: Inches): TestBendDraft => ({
  brakeId,
  stripWidth: null,
  legA: null,
  legB: null,
  turn: 90,
  thickness,
  insideRadius: null,
  note: '',
})

export type MeasuredField = 'stripWidth' | 'legA' | 'legB' | 'turn' | 'thickness' | 'insideRadius'

export type TestBendCheck =
  | {
      readonly kind: 'ready'
      readonly body: TestBendInput
      /** K at the radius that was measured, or at the stock's own; null where no K lies in the sheet. */
      readonly kFactor: number | null
    }
  /** Fields that a person has still to fill in, or whose value means nothing. */
  | { readonly kind: 'open'; readonly fields: readonly MeasuredField[] }

const FIELDS: readonly MeasuredField[] = [
  'stripWidth',
  'legA',
  'legB',
  'turn',
  'thickness',
  'insideRadius',
]

const isMeasured = (path: PropertyKey | undefined): path is MeasuredField =>
  FIELDS.some((field) => field === path)

/**
 * What a draft comes to. The K is that of this bend alone, at the measured radius or, where none
 * was measured, at `ownRadius`, the stock's.
 */
export function checkTestBend(draft: TestBendDraft, ownRadius: Inches): TestBendCheck {
  const parsed = testBendInputSchema.safeParse(draft)
  if (!parsed.success) {
    const fields = parsed.error.issues.flatMap(({ path: [field] }) =>
      isMeasured(field) ? [field] : [],
    )
    return { kind: 'open', fields: [...new Set(fields)] }
  }
  const body = parsed.data
  const result = kFactorFromTestBend({ ...body, insideRadius: body.insideRadius ?? ownRadius })
  return { kind: 'ready', body, kFactor: result.ok ? result.kFactor : null }
}
