import type { Db } from '#server/db/knex'
import { labelContent, labelSection } from '#server/features/labels/label-content'
import { labelPages } from '#server/features/labels/label-pages'
import {
  findLockedPieces,
  findNumber,
  findPieceStand,
  findPrint,
  isLabelled,
  listPrints,
  readLabelFacts,
  type PiecesOf,
} from '#server/features/labels/labels.queries'
import { insertPrint } from '#server/features/labels/labels.store'
import { makingPorts, type MakingPorts } from '#server/features/pieces/making-ports'
import { readCode } from '#server/features/pieces/read-code'
import { notFound, wrongState, type ProblemError } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import type { DisplayList } from '#shared/drawing/display-list'
import type { BodyOf, FileAnswer } from '#shared/http/endpoint'
import type { LabelPrint, LabelsOf, printLabels } from '#shared/labels/labels.contract'
import { orderNumber } from '#shared/orders/order.schema'

export interface LabelsService {
  /** Throws `not-found`, and `wrong-state` where no piece is there to get a label. */
  readonly print: (wish: BodyOf<typeof printLabels>, person: SignedIn) => Promise<LabelPrint>
  readonly listPrints: (code: string) => Promise<{ items: LabelPrint[] }>
  /** In the language and the units of the person; throws `wrong-state` when every piece has ended. */
  readonly labelsPdf: (
    printId: string,
    person: Pick<SignedIn, 'language' | 'units'>,
    signal: AbortSignal,
  ) => Promise<FileAnswer>
}

export const createLabelsService = (db: Db, ports: MakingPorts = makingPorts): LabelsService => ({
  print: async ({ of, paper }, person) => {
    const pieces = await findLockedPieces(db, piecesOf(of))
    if (pieces.length === 0) throw await nothingToLabel(db, of)
    const at = ports.clock?.now()
    const id = await insertPrint(db, { paper, personId: person.id, at }, pieces)
    return getPrint(db, id)
  },

  listPrints: async (typed) => {
    const code = readCode(typed, 'piece')
    if (!(await findPieceStand(db, code))) throw notFound('piece')
    return { items: await listPrints(db, code) }
  },

  labelsPdf: async (printId, { language, units }, signal) => {
    const print = await getPrint(db, printId)
    const rows = (await readLabelFacts(db, printId)).filter(({ state }) => isLabelled(state))
    if (rows.length === 0) {
      throw wrongState('Every piece of this print has been scrapped or withdrawn since.')
    }
    const sections = new Map<string, DisplayList>()
    const labels = rows.map(({ lineId, facts }) => {
      const section = sections.get(lineId) ?? labelSection(facts)
      sections.set(lineId, section)
      return labelContent(facts, units, section)
    })
    const { paper } = print
    const bytes = await labelPages({ labels, paper, language, at: new Date(print.at), signal })
    return { name: `labels-${print.id.slice(0, 8)}.pdf`, bytes }
  },
})

const piecesOf = (of: LabelsOf): PiecesOf => {
  switch (of.kind) {
    case 'piece':
      return { code: readCode(of.code, 'piece', 'of.code') }
    case 'run':
      return { run_id: of.runId }
    case 'order':
      return { order_id: of.orderId }
  }
}

async function getPrint(db: Db, id: string): Promise<LabelPrint> {
  const print = await findPrint(db, id)
  if (!print) throw notFound('print')
  return print
}

/** Why a wish finds no piece: what it names is not there, or nothing of it is left to be labelled. */
async function nothingToLabel(db: Db, of: LabelsOf): Promise<ProblemError> {
  if (of.kind === 'piece') return nothingOfPiece(db, readCode(of.code, 'piece', 'of.code'))
  if (of.kind === 'run') {
    const number = await findNumber(db, 'runs', of.runId)
    if (number === undefined) return notFound('run')
    return wrongState(`All pieces of run ${number} were scrapped or withdrawn.`)
  }
  const number = await findNumber(db, 'orders', of.orderId)
  if (number === undefined) return notFound('order')
  return wrongState(
    `${orderNumber(number)} has no pieces to label: it is not released, or all were scrapped or withdrawn.`,
  )
}

async function nothingOfPiece(db: Db, code: string): Promise<ProblemError> {
  const piece = await findPieceStand(db, code)
  if (!piece) return notFound('piece')
  const cure = piece.remadeAs === null ? '' : ` Print the label of ${piece.remadeAs}, its remake.`
  return wrongState(`${code} was ${piece.state} and gets no label any more.${cure}`)
}
