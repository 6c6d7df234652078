import type { EndProblem, EndProblemCode } from '#shared/ends/end-layout'
import { printAngle } from '#shared/units/angle'
import { printSize } from '#shared/units/print-length'

type Print = (value: number | null) => string

const inches: Print = (value) =>
  value !== null && Number.isFinite(value) ? printSize(value, 'fraction', 64) : '?'
const angle: Print = (value) =>
  value !== null && Number.isFinite(value) ? printAngle(value, 2) : '?'
const plain: Print = (value) => String(value ?? '?')

/** How found and limit are read, what is wrong and what cures it. `{part}` is the leg or the end. */
const TEXTS: Record<EndProblemCode, readonly [print: Print, text: string]> = {
  profileFaulty: [plain, 'The profile has no strip to cut ends on. Put the profile right first.'],
  noSuchLeg: [plain, 'Leg {found} is named and the profile has {limit}. Name one of its legs.'],
  legNamedTwice: [plain, 'Leg {leg} is named more than once. Name each leg once.'],
  notFinite: [plain, '{part} holds a value that is not a number above zero. Send a number.'],
  planeAlongPiece: [
    angle,
    '{part} is cut at {found} to the piece, which runs along it; at least {limit}. Change slope or turn.',
  ],
  cornerTurnsBack: [
    angle,
    'The corner turns the run by {found}, nearly back on itself; at most {limit}. Change slopes or turn.',
  ],
  lapLongerThanPiece: [
    inches,
    'The lap of {found} is as long as the piece of {limit}. Shorten the lap.',
  ],
  tabLongerThanPiece: [
    inches,
    'The tab of {found} on leg {leg} is as long as the piece of {limit}. Shorten the tab.',
  ],
  endsMeet: [
    inches,
    'Both cuts together take {found} off leg {leg} of a strip of {limit} and leave nothing of it. Lengthen the piece or cut less.',
  ],
}

/** The problem and what cures it, in the API's English: `The lap of 4" is as long as … Shorten the lap.` */
export function endProblemText({ code, end, leg, found, limit }: EndProblem): string {
  const [print, text] = TEXTS[code]
  return text
    .replace('{part}', leg === null ? `The ${end} end` : `Leg ${leg} at the ${end} end`)
    .replace('{leg}', plain(leg))
    .replace('{found}', print(found))
    .replace('{limit}', print(limit))
}
