import { cpus } from 'node:os'
import { z } from 'zod'
import type { BenchShop } from './bench-shop'
import { openBenchShop } from './bench-shop'
import { tableLines } from './bench-table'
import { benchDrawing } from './drawing.bench'
import { benchEnds } from './ends.bench'
import { benchExplain } from './explain.bench'
import { benchLabels, labelsTitle } from './labels.bench'
import { benchMoves, movesTitle } from './moves.bench'
import { benchOrders, ordersTitle } from './orders.bench'
import { benchPlan } from './plan.bench'
import { benchPlanning, planningTitle } from './planning.bench'
import { benchStrip } from './strip.bench'

const versionSchema = z.object({ rows: z.tuple([z.object({ server_version: z.string() })]) })

/** Words that hold for the figures: what ran them. */
async function machineLine({ db }: BenchShop): Promise<string> {
  const { rows } = versionSchema.parse(await db.raw('show server_version'))
  const processors = cpus()
  const model = processors[0]?.model.trim() ?? ''
  return [
    `Node ${process.versions.node}`,
    `PostgreSQL ${rows[0].server_version.split(' ')[0] ?? ''}`,
    `${processors.length} x ${model || process.arch}`,
  ].join(', ')
}

// The kernel first: nothing else of ours runs on the machine then.
const kernel = [
  { title: 'Strip, in this process', rows: benchStrip() },
  { title: 'Piece ends, in this process', rows: benchEnds() },
  { title: 'Bend plan, in this process', rows: benchPlan() },
  { title: 'Why not and what would cure it, in this process', rows: benchExplain() },
  { title: 'Drawing, in this process', rows: benchDrawing() },
  { title: labelsTitle, rows: await benchLabels() },
]

const shop = await openBenchShop()
try {
  const groups = [
    ...kernel,
    { title: planningTitle, rows: await benchPlanning(shop) },
    { title: ordersTitle, rows: await benchOrders(shop) },
    { title: movesTitle, rows: await benchMoves(shop) },
  ]
  const lines = [await machineLine(shop), '', ...tableLines(groups)]
  process.stdout.write(`${lines.join('\n')}\n`)
} finally {
  await shop.close()
}
