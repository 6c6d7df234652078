import { apronMeetsRear } from './apron-meets-rear'
import { cannotLoad } from './cannot-load'
import { frontMeetsTool } from './front-meets-tool'
import { meetsItself } from './meets-itself'
import { rearMeetsTool } from './rear-meets-tool'
import { trapped } from './trapped'
import { angle } from './angle'
import { clamp } from './clamp'
import { direction } from './direction'
import { flange } from './flange'
import type { FoldTest } from './fold-test'
import { gauge } from './gauge'
import { hemSide } from './hem-side'
import { policy } from './policy'
import { throat } from './throat'

/** The tests of one fold, in the order in which they are made and reported. */
export const FOLD_TESTS: readonly FoldTest[] = [
  direction,
  hemSide,
  policy,
  angle,
  flange,
  clamp,
  throat,
  gauge,
  rearMeetsTool,
  frontMeetsTool,
  meetsItself,
  apronMeetsRear,
  cannotLoad,
  trapped,
]
