import type { Profile } from '#shared/profile/profile.schema'
import { dimensionLines } from './dimension-labels'
import type { DisplayItem, Part, Role } from './display-list'
import { isSamePart } from './display-list'
import type { PlacedLabel } from './label-space'
import { linesOfLabel, middleOfLabel } from './label-space'
import type { Pen } from './pen'
import type { SectionLabel } from './section-labels'
import type { PlacedSection } from './section-view'
import { path, text } from './strip-items'

export interface Marks {
  readonly selected: Part | null
  readonly hovered: Part | null
  readonly problems: readonly Part[]
  readonly warnings: readonly Part[]
}

const TARGET_WIDTH = 26

/** The bands on either side, then the metal over them, then what is marked. */
export const drawMetal = (
  profile: Profile,
  section: PlacedSection,
  pen: Pen,
  marks: Marks,
): DisplayItem[] => {
  const items: DisplayItem[] = []
  for (const [side, sign] of [
    ['left', 1],
    ['right', -1],
  ] as const) {
    const isPainted = profile.colorSide === side || profile.colorSide === 'both'
    const band = isPainted ? pen.paint : pen.bare
    // A little overlap, so that no light shows between band and metal.
    const overlap = Math.min(0.5, pen.metal / 4)
    const points = section.chain((sign * (pen.metal + band - overlap)) / 2)
    if (isPainted) items.push(path('paintEdge', points, band + overlap + 1))
    items.push(path(isPainted ? 'paint' : 'bare', points, band + overlap))
  }
  items.push(path('metal', section.chain(0), pen.metal))
  const isMarked =
    marks.selected || marks.hovered || marks.problems.length > 0 || marks.warnings.length > 0
  for (const { part, points } of isMarked ? section.parts().toReversed() : []) {
    const role = markOf(part, marks)
    if (role !== undefined) items.push(path(role, points, pen.metal, part))
  }
  return items
}

const markOf = (part: Part, marks: Marks): Role | undefined => {
  if (marks.selected && isSamePart(part, marks.selected)) return 'selected'
  if (marks.problems.some((problem) => isSamePart(part, problem))) return 'problem'
  if (marks.warnings.some((warning) => isSamePart(part, warning))) return 'warning'
  if (marks.hovered && isSamePart(part, marks.hovered)) return 'hovered'
  return undefined
}

/** Legs first, so that the bends and hems between them lie on top. */
export const drawTargets = (section: PlacedSection): DisplayItem[] =>
  section
    .parts()
    .toReversed()
    .map(({ part, points }) => path('target', points, TARGET_WIDTH, part))

export const drawLabel = (
  label: PlacedLabel,
  meaning: SectionLabel,
  pen: Pen,
  marks: Marks,
): DisplayItem[] => {
  const mark = markOf(meaning.part, marks)
  const { part } = meaning
  const lineRole = mark ?? (part.kind === 'edge' ? 'edge' : 'dimension')
  const at = middleOfLabel(label)
  const lines = linesOfLabel(label)
  const drawn = label.isDimension ? dimensionLines(lines) : lines
  const items: DisplayItem[] = drawn.map((points) => path(lineRole, points, pen.hairline, part))
  if (label.radius !== undefined) {
    items.push({
      kind: 'circle',
      role: lineRole,
      part,
      center: at,
      radius: label.radius,
      width: pen.hairline,
      filled: false,
    })
  }
  const isBold = mark !== undefined || part.kind === 'edge'
  items.push(text(mark ?? meaning.role, label.text, at, label.size, part, isBold))
  return items
}
