import type { SvgAttributes } from '#shared/drawing/svg'

/** SVG's names in React's spelling: stroke-width is strokeWidth. */
const reactName = (name: string) =>
  name.replace(/-([a-z])/g, (_, letter: string) => letter.toUpperCase())

export const reactAttributes = (attributes: SvgAttributes): SvgAttributes =>
  Object.fromEntries(Object.entries(attributes).map(([name, value]) => [reactName(name), value]))
