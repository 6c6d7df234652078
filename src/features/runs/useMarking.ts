import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { pieceMark } from '#shared/pieces/piece-mark'
import type { CodeFault } from '#shared/pieces/codes'
import type { Run } from '#shared/runs/runs.contract'
import type { BandAnswer } from '@/components/Band'
import { useBendPiece, useScrapPiece, useUndoMoves } from '@/features/pieces/api/pieces.mutations'
import { useScanWords } from '@/features/pieces/useScanWords'
import { useBendCount } from './api/runs.mutations'

/** What the last press or scan did, and what would take it back. */
interface Told extends Omit<BandAnswer, 'action'> {
  readonly undoable: readonly number[]
}

/**
 * Marking the pieces of a run: by code, several by count, spoiled, and taken back. Every answer is
 * told once, with what was moved, so that it can be undone.
 */
export function useMarking(run: Run) {
  const { t } = useTranslation('brake')
  const words = useScanWords()
  const [told, setTold] = useState<Told | null>(null)
  const bendPiece = useBendPiece()
  const bendSeveral = useBendCount(run.id)
  const scrapPiece = useScrapPiece()
  const undoMoves = useUndoMoves()

  const tell = (answer: Omit<Told, 'id' | 'undoable'>, undoable: readonly number[] = []) =>
    setTold((before) => ({ ...answer, undoable, id: Number(before?.id ?? 0) + 1 }))
  const tellError = (mark: string | undefined) => (error: unknown) =>
    tell({ kind: 'error', ...(mark === undefined ? {} : { mark }), ...words.ofError(error) })

  function markBent(code: string) {
    bendPiece.mutate(
      { code, runId: run.id },
      {
        onSuccess: ({ piece, eventId }) =>
          tell(
            {
              kind: 'done',
              mark: pieceMark(piece),
              title: t('told.bent'),
              detail: piece.code,
            },
            [eventId],
          ),
        onError: tellError(code),
      },
    )
  }

  function markSeveral(count: number, length: number, onDone: () => void) {
    bendSeveral.mutate(
      { count, length },
      {
        onSuccess: ({ eventIds }) =>
          tell({ kind: 'done', title: t('told.several', { count: eventIds.length }) }, eventIds),
        onError: tellError(undefined),
        onSettled: onDone,
      },
    )
  }

  function markSpoiled(code: string, reason: string, onDone: () => void) {
    scrapPiece.mutate(
      { code, reason },
      {
        onSuccess: ({ piece, remake }) =>
          tell({
            kind: 'warn',
            mark: pieceMark(piece),
            title: t('told.scrapped'),
            detail: t('told.remake', { code: remake.code }),
          }),
        onError: tellError(code),
        onSettled: onDone,
      },
    )
  }

  function undo() {
    if (told === null || told.undoable.length === 0) return
    undoMoves.mutate(
      { eventIds: [...told.undoable], reason: t('told.undoReason') },
      {
        onSuccess: ({ pieces }) =>
          tell({ kind: 'warn', title: t('told.undone', { count: pieces.length }) }),
        onError: tellError(undefined),
      },
    )
  }

  return {
    told,
    markBent,
    markSeveral,
    markSpoiled,
    undo,
    tellFault: (fault: CodeFault | 'otherKind', typed: string) =>
      tell({ kind: 'error', mark: typed.toUpperCase(), ...words.ofFault(fault) }),
    pending: bendSeveral.isPending || scrapPiece.isPending || undoMoves.isPending,
  }
}
