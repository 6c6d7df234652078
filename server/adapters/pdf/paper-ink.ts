import { PALETTE } from '#shared/drawing/palette'

/** The colors of words and rules on paper: those of the light theme on white. */
export const PAPER_INK = {
  ink: PALETTE.light.ink,
  quiet: PALETTE.light.scribe,
  rule: PALETTE.light.rule,
  warn: PALETTE.light.ochre,
  paper: PALETTE.light.sheet,
} as const
