import 'konva/lib/shapes/Circle'
import { Circle, Group } from 'react-konva/lib/ReactKonvaCore'
import type { Vector } from '#shared/geometry/vector'
import { toFrame, type Viewport } from '../model/viewport'

interface Props {
  readonly corners: readonly Vector[]
  readonly viewport: Viewport
  /** The corner in hand or selected. */
  readonly active: number | null
  readonly color: string
  readonly paper: string
}

const RADIUS = 6
const ACTIVE_RADIUS = 9

/** What a finger can take hold of. Taking hold is decided by the canvas, so these do not listen. */
export function CornerHandles({ corners, viewport, active, color, paper }: Props) {
  return (
    <Group listening={false}>
      {corners.map((corner, index) => (
        <Circle
          key={index}
          name="corner"
          {...toFrame(viewport, corner)}
          radius={index === active ? ACTIVE_RADIUS : RADIUS}
          fill={index === active ? color : paper}
          stroke={color}
          strokeWidth={2}
        />
      ))}
    </Group>
  )
}
