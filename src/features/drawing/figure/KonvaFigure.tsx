import 'konva/lib/shapes/Circle'
import 'konva/lib/shapes/Line'
import 'konva/lib/shapes/Text'
import { memo } from 'react'
import { Circle, Group, Line, Text } from 'react-konva/lib/ReactKonvaCore'
import type { DisplayItem, DisplayList, Part } from '#shared/drawing/display-list'
import type { FigureColors } from '#shared/drawing/figure-colors'
import { FIGURE_FONT } from '#shared/drawing/figure-colors'
import { textWidth } from '#shared/drawing/text-box'

interface KonvaFigureProps {
  display: DisplayList
  colors: FigureColors
  /** Called with the part under a press; draw the figure with `targets`. */
  onPart?: (part: Part) => void
}

interface ItemProps {
  item: DisplayItem
  colors: FigureColors
  onPart?: (part: Part) => void
}

const FigureItem = ({ item, colors, onPart }: ItemProps) => {
  const color = colors.roles[item.role]
  const { part } = item
  const isTarget = item.role === 'target' && part !== undefined && onPart !== undefined
  const press = isTarget ? () => onPart(part) : undefined
  const events = { listening: isTarget, onClick: press, onTap: press }
  switch (item.kind) {
    case 'path':
      return (
        <Line
          {...events}
          points={item.points.flatMap(({ x, y }) => [x, y])}
          closed={item.closed}
          fill={item.filled ? color : undefined}
          stroke={item.width > 0 ? color : undefined}
          strokeWidth={item.width}
          dash={item.dash ? [...item.dash] : undefined}
          lineJoin="round"
          perfectDrawEnabled={false}
        />
      )
    case 'circle':
      return (
        <Circle
          {...events}
          x={item.center.x}
          y={item.center.y}
          radius={item.radius}
          fill={item.filled ? color : undefined}
          stroke={item.width > 0 ? color : undefined}
          strokeWidth={item.width}
          perfectDrawEnabled={false}
        />
      )
    case 'text': {
      const width = textWidth(item.text, item.size) + item.size
      return (
        <Text
          {...events}
          x={item.at.x}
          y={item.at.y}
          offsetX={width / 2}
          offsetY={item.size / 2}
          width={width}
          height={item.size}
          align="center"
          verticalAlign="middle"
          wrap="none"
          rotation={item.rotation}
          text={item.text}
          fontFamily={FIGURE_FONT}
          fontSize={item.size}
          fontStyle={item.bold ? 'bold' : 'normal'}
          fill={color}
          perfectDrawEnabled={false}
        />
      )
    }
  }
}

/** Draws a display list on a Konva layer; put it inside a Stage and a Layer. */
export const KonvaFigure = memo(({ display, colors, onPart }: KonvaFigureProps) => (
  <Group listening={onPart !== undefined}>
    {display.items.map((item, index) => (
      <FigureItem key={index} item={item} colors={colors} onPart={onPart} />
    ))}
  </Group>
))
KonvaFigure.displayName = 'KonvaFigure'
