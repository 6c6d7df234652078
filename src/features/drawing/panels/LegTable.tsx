import type { Dispatch } from 'react'
import { useTranslation } from 'react-i18next'
import type { Part } from '#shared/drawing/display-list'
import { isSamePart } from '#shared/drawing/display-list'
import { colorSideSchema, type Profile } from '#shared/profile/profile.schema'
import type { ProfileEdit } from '#shared/profile/edits'
import { Button } from '@/components/Button'
import { Select } from '@/components/Select'
import { DimensionField } from '@/components/keypad/DimensionField'
import { usePerson } from '@/features/people/person-context'
import type { Board, BoardEvent } from '../model/board'
import { addLeg, editProfile } from '../model/board-document'
import { partsInOrder } from '../model/parts-in-order'
import { usePartName } from '../usePartName'
import { ActionButton } from './ActionButton'
import { AngleField } from './AngleField'

interface Props {
  readonly board: Board
  readonly dispatch: Dispatch<BoardEvent>
}

/** The whole drawing as a form, row by row from edge A to edge B: every edit without the canvas. */
export function LegTable({ board, dispatch }: Props) {
  const { t } = useTranslation('drawing')
  const nameOf = usePartName()
  const { profile } = board.history.present

  const edit = (change: ProfileEdit, typing?: string) =>
    dispatch({
      type: 'change',
      document: editProfile(board.history.present, change),
      ...(typing === undefined ? {} : { typing }),
    })
  const addAt = (edge: 'A' | 'B') =>
    dispatch({ type: 'change', document: addLeg(board.history.present, edge) })

  return (
    <section aria-label={t('table.name')} className="flex flex-col gap-3">
      {profile && (
        <ol className="flex flex-col gap-2">
          {partsInOrder(profile).map((part) => (
            <li
              key={nameOf(part)}
              className="flex items-end gap-2 border-l-4 border-transparent pl-2 data-[selected=true]:border-dye"
              data-selected={board.selection !== null && isSamePart(part, board.selection)}
              onFocus={() => dispatch({ type: 'select', part })}
            >
              <PartField part={part} profile={profile} edit={edit} label={nameOf(part)} />
            </li>
          ))}
        </ol>
      )}
      <div className="flex flex-wrap gap-2">
        <Button onClick={() => addAt('A')}>{t('table.addLegA')}</Button>
        <Button onClick={() => addAt('B')}>{t('table.addLegB')}</Button>
        <ActionButton action="hemA" board={board} dispatch={dispatch} wide />
        <ActionButton action="hemB" board={board} dispatch={dispatch} wide />
        <ActionButton action="deletePart" board={board} dispatch={dispatch} wide />
      </div>
      {profile && (
        <Select
          label={t('table.colorOn')}
          value={profile.colorSide}
          options={colorSideSchema.options.map((side) => ({
            value: side,
            label: t(side === 'none' ? 'table.noColor' : `table.${side}`),
          }))}
          onChange={(event) =>
            edit({ kind: 'setColorSide', colorSide: colorSideSchema.parse(event.target.value) })
          }
        />
      )}
    </section>
  )
}

interface PartFieldProps {
  readonly part: Part
  readonly profile: Profile
  readonly label: string
  readonly edit: (change: ProfileEdit, typing?: string) => void
}

function PartField({ part, profile, label, edit }: PartFieldProps) {
  const { units } = usePerson()
  switch (part.kind) {
    case 'leg':
      return (
        <DimensionField
          label={label}
          className="flex-1"
          value={profile.legs[part.leg - 1] ?? null}
          units={units}
          onChange={(length) =>
            length !== null && edit({ kind: 'setLeg', leg: part.leg, length }, `leg ${part.leg}`)
          }
        />
      )
    case 'bend':
      return (
        <div className="flex-1">
          <AngleField
            label={label}
            turn={profile.bends[part.bend - 1]?.turn ?? 0}
            onChange={(turn) =>
              edit({ kind: 'setTurn', bend: part.bend, turn }, `bend ${part.bend}`)
            }
          />
        </div>
      )
    case 'hem': {
      const hem = part.edge === 'A' ? profile.hemA : profile.hemB
      return (
        <DimensionField
          label={label}
          className="flex-1"
          value={hem?.length ?? null}
          units={units}
          onChange={(length) =>
            length !== null &&
            hem &&
            edit({ kind: 'setHem', edge: part.edge, hem: { ...hem, length } }, `hem ${part.edge}`)
          }
        />
      )
    }
    case 'edge':
      return null
  }
}
