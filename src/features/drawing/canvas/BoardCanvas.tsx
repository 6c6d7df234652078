import { useState, type CSSProperties, type Dispatch } from 'react'
import { Layer, Stage } from 'react-konva/lib/ReactKonvaCore'
import { useTranslation } from 'react-i18next'
import type { FigureColors } from '#shared/drawing/figure-colors'
import type { Part } from '#shared/drawing/display-list'
import type { FigureLabels } from '#shared/drawing/section-figure'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Degrees } from '#shared/units/brands'
import { KonvaFigure } from '../figure/KonvaFigure'
import { shownDocument, type Board, type BoardEvent } from '../model/board'
import { cornersOf, type BoardDocument } from '../model/board-document'
import { fitViewport, zoomAbout, type Viewport } from '../model/viewport'
import { CornerHandles } from './CornerHandles'
import { viewportOf } from './sheet-view'
import { SnapGuides } from './SnapGuides'
import { useBoardFigure } from './useBoardFigure'
import type { ElementSize } from './useElementSize'
import { useElementSize } from './useElementSize'
import { useSheetPointers } from './useSheetPointers'

interface Props {
  readonly board: Board
  readonly dispatch: Dispatch<BoardEvent>
  readonly sheet: Sheet
  readonly colors: FigureColors
  readonly labels: FigureLabels
  /** What cannot be made, and what can but deserves a look. */
  readonly problems: readonly Part[]
  readonly warnings: readonly Part[]
  /** The job's slope, where there is one. */
  readonly pitch: Degrees | null
  readonly snapping: boolean
}

/** A view that a hand has set, good until the drawing is changed by something else than a hand. */
interface HeldView {
  readonly view: Viewport
  readonly of: BoardDocument
}

/** How far a corner is pulled to a round value, in pixels. */
const SNAP_REACH = 12
const STEP = 1 / 8
const ANGLE_STEP = 15

/** The drawing sheet: the section with handles on its corners. State comes in, events go out. */
export function BoardCanvas(props: Props) {
  const { t } = useTranslation('drawing')
  const { ref, size } = useElementSize()
  return (
    <div
      ref={ref}
      className="relative min-h-0 flex-1 touch-none overflow-hidden select-none"
      data-testid="board-canvas"
      role="img"
      aria-label={t('canvas.name')}
    >
      {size !== null && size.width > 0 && size.height > 0 && <SizedCanvas {...props} size={size} />}
    </div>
  )
}

function SizedCanvas({
  board,
  dispatch,
  sheet,
  colors,
  labels,
  problems,
  warnings,
  pitch,
  snapping,
  size,
}: Props & { size: ElementSize }) {
  const [held, setHeld] = useState<HeldView | null>(null)
  const shown = shownDocument(board)
  const isBusy = board.gesture.kind !== 'idle'
  const corners = cornersOf(shown)

  const isHeld = held !== null && (isBusy || held.of === board.history.present)
  const heldView = isHeld ? held.view : null
  const figure = useBoardFigure(shown, heldView, {
    sheet,
    size,
    labels,
    problems,
    warnings,
    selected: board.selection,
  })
  const viewport =
    heldView ?? (figure ? viewportOf(figure.view, shown.placement) : fitViewport(corners, size))

  const pointers = useSheetPointers({
    board,
    dispatch,
    viewport,
    holdView: (view) => setHeld({ view, of: board.history.present }),
    findPart: (at, reach) => figure?.findPart(at, reach),
    snap: {
      on: snapping,
      step: STEP,
      angleStep: ANGLE_STEP,
      pitch,
      reach: SNAP_REACH / viewport.scale,
    },
  })

  return (
    <div
      className="absolute inset-0"
      style={board.tool === 'draw' ? inchDots(viewport) : undefined}
      {...pointers}
      onPointerUp={(event) => {
        // The gesture's figure becomes the document: the view stays under the finger.
        if (isBusy) setHeld({ view: viewport, of: shown })
        pointers.onPointerUp(event)
      }}
      onWheel={(event) => {
        const box = event.currentTarget.getBoundingClientRect()
        const at = { x: event.clientX - box.left, y: event.clientY - box.top }
        setHeld({
          view: zoomAbout(viewport, at, Math.exp(-event.deltaY / 400)),
          of: board.history.present,
        })
      }}
    >
      <Stage {...size} listening={false}>
        <Layer listening={false}>
          {board.gesture.kind !== 'idle' && (
            <SnapGuides
              guides={board.gesture.guides}
              viewport={viewport}
              color={colors.roles.selected}
            />
          )}
          {figure && <KonvaFigure display={figure.display} colors={colors} />}
          <CornerHandles
            corners={corners}
            viewport={viewport}
            active={activeCorner(board, corners.length)}
            color={colors.roles.selected}
            paper={colors.ground}
          />
        </Layer>
      </Stage>
    </div>
  )
}

/** A dot at every inch while corners are being put down. */
function inchDots({ scale, origin }: Viewport): CSSProperties {
  const half = scale / 2
  return {
    backgroundImage: 'radial-gradient(circle, var(--edge) 1px, transparent 1.5px)',
    backgroundSize: `${scale}px ${scale}px`,
    backgroundPosition: `${origin.x - half}px ${origin.y - half}px`,
  }
}

function activeCorner({ gesture, selection }: Board, count: number): number | null {
  if (gesture.kind === 'corner') return gesture.index
  if (gesture.kind === 'draw') return gesture.edge === 'A' ? 0 : count - 1
  if (selection?.kind === 'bend') return selection.bend
  if (selection?.kind === 'edge') return selection.edge === 'A' ? 0 : count - 1
  return null
}
