import { labelContent, labelSection } from '#server/features/labels/label-content'
import { labelPages } from '#server/features/labels/label-pages'
import type { LabelPaper } from '#shared/labels/labels.contract'
import { composeCode } from '#shared/pieces/codes'
import { getStarter } from '#shared/profile/starters'
import type { Stock } from '#shared/stock/stock.schema'
import type { BenchRow } from './bench-row'
import { percentiles } from './bench-row'

const LABELS = 100
const TIMES = 15

const STOCK: Stock = {
  id: '00000000-0000-4000-8000-000000000000',
  thicknessName: '24 ga',
  colorName: 'Kiln 4',
  colorHex: '#8a3b2c',
  painted: true,
  widestStrip: 48,
  longestPiece: 126,
  sheet: {
    metal: 'steel',
    thickness: 0.0276,
    insideRadius: 0.0394,
    kFactor: 0.408,
    density: 0.2836,
    springbackPer90: 0.9,
  },
  kSource: 'shop',
  paintTBend: null,
  alloy: null,
  calibrations: [],
}

const codeOf = (number: number): string => {
  for (let tried = number * 7; ; tried += 1) {
    const code = composeCode('piece', String(100_000 + tried))
    if (code !== null) return code
  }
}

const FACTS = {
  mark: 'A',
  name: 'Gable, north rake',
  profile: getStarter('gableRake').profile,
  stock: STOCK,
  length: 126,
  weight: 9.4,
  hand: 'left',
  lowEnd: 'left',
  orderNumber: 2047,
  poNumber: '1187',
  company: 'Tamsin & Reed',
  job: 'Larkspur barn',
} as const

export const labelsTitle = `Labels as a PDF, in this process: ${LABELS} at a time`

/** How long a run's labels take, and how many pages that is a second. */
export async function benchLabels(): Promise<BenchRow[]> {
  const section = labelSection(FACTS)
  const labels = Array.from({ length: LABELS }, (_, index) =>
    labelContent(
      { ...FACTS, code: codeOf(index), sequence: index + 1, quantity: LABELS },
      'fraction',
      section,
    ),
  )
  const papers: [LabelPaper, name: string, pages: number][] = [
    ['roll4x2', 'on a 4 x 2 in. roll', LABELS],
    ['letter', 'ten to a letter sheet', LABELS / 10],
  ]
  const rows: BenchRow[] = []
  for (const [paper, name, pages] of papers) {
    const draw = () =>
      labelPages({
        labels,
        paper,
        language: 'en',
        at: new Date(0),
        signal: new AbortController().signal,
      })
    await draw()
    const took: number[] = []
    for (let time = 0; time < TIMES; time += 1) {
      const start = performance.now()
      await draw()
      took.push(performance.now() - start)
    }
    const { p50 } = percentiles(took)
    const note = `${Math.round((pages / p50) * 1000)} pages/s, ${Math.round((LABELS / p50) * 1000)} labels/s`
    rows.push({ name, unit: 'ms', ...percentiles(took), note })
  }
  return rows
}
