import { isEqual } from '#shared/geometry/tolerance'
import type { Brake, ToolSet } from './brake.schema'

const isSamePolygon = (a: ToolSet['inner'], b: ToolSet['inner']): boolean =>
  a.length === b.length &&
  a.every(([x, y], i) => {
    const other = b[i]
    return other !== undefined && isEqual(x, other[0]) && isEqual(y, other[1])
  })

/**
 * Whether the brake folds up and down with the same tools. The fold frame is the same for both
 * directions, so equal tools give equal answers.
 */
export const hasSameToolsBothWays = ({ up, down }: Brake): boolean =>
  down !== null &&
  isSamePolygon(up.inner, down.inner) &&
  isSamePolygon(up.outer, down.outer) &&
  isSamePolygon(up.apron, down.apron)
