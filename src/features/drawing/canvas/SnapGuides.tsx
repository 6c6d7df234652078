import 'konva/lib/shapes/Circle'
import 'konva/lib/shapes/Line'
import { Circle, Group, Line } from 'react-konva/lib/ReactKonvaCore'
import { heading, type Vector } from '#shared/geometry/vector'
import type { SnapGuide } from '../model/snapping'
import { toFrame, type Viewport } from '../model/viewport'

interface Props {
  readonly guides: readonly SnapGuide[]
  readonly viewport: Viewport
  readonly color: string
}

/** Longer than any canvas. */
const FAR = 4000

/** Why a corner stuck where it is: the ray of its angle, the circle of its length. */
export function SnapGuides({ guides, viewport, color }: Props) {
  return (
    <Group listening={false}>
      {guides.map((guide, index) => {
        const from = toFrame(viewport, guide.from)
        return guide.kind === 'length' ? (
          <Circle
            key={index}
            {...from}
            radius={guide.length * viewport.scale}
            stroke={color}
            strokeWidth={1}
            dash={guide.equalLeg ? undefined : [2, 6]}
            opacity={0.6}
          />
        ) : (
          <Line
            key={index}
            points={ray(from, heading(guide.heading))}
            stroke={color}
            strokeWidth={1}
            dash={[6, 4]}
          />
        )
      })}
    </Group>
  )
}

const ray = (from: { x: number; y: number }, direction: Vector) => [
  from.x,
  from.y,
  from.x + direction.x * FAR,
  from.y - direction.y * FAR,
]
