import type { ProfileCureCode, ProfileProblem, ProfileProblemCode } from '#shared/profile/problem'
import { problemMessage } from '#shared/profile/problem-message'

/** Parts in braces are filled with the values of the problem. */
const PROBLEMS: Record<ProfileProblemCode, string> = {
  notFinite: '{part} holds a value that is not a number.',
  bendCountMismatch: 'There are {found} bends where the legs need {limit}.',
  tooManyBends: 'There are {found} bends; at most {limit} can be planned.',
  legNotPositive: '{part} is {found} long and must be longer than zero.',
  turnOutOfRange: '{part} turns {found}; a bend turns more than 0° and less than 180°.',
  followsIncomplete: '{part} joins two slopes and only one is given.',
  pitchOutOfRange:
    '{part} follows a slope of {found}; a roof slopes at least 0° and less than 90°.',
  hemNotPositive: '{part} is {found} long and must be longer than zero.',
  gapNotPositive: '{part} is open and its gap of {found} must be more than zero.',
  legEatenByBends: '{part} is {found} long, and its bends alone take {limit}.',
  hemTooShort: '{part} is {found} long, and its fold alone takes {limit}.',
  hemTooLong: '{part} is {found} long, and its leg has room for {limit}.',
  crossesItself: '{part} would lie where another part of the sheet lies.',
  stripTooWide: 'The strip is {found} wide; the widest that can be bent is {limit}.',
  stripWiderThanStock: 'The strip is {found} wide; this stock gives at most {limit}.',
  radiusTight: 'The inside radius of {found} is less than half the thickness ({limit}).',
  radiusBelowMetal: 'The inside radius of {found} is less than this metal bears ({limit}).',
  radiusBelowPaint:
    '{part} stretches the paint round a radius of {found}; it is rated for {limit}.',
  hemBelowPaint: '{part} folds the paint round a radius of {found}; it is rated for {limit}.',
  gapTight: '{part} has a gap of {found}, less than the thickness ({limit}).',
}

const CURES: Record<ProfileCureCode, string> = {
  enterNumber: 'Send a number.',
  matchBends: 'Send one bend fewer than legs.',
  splitPiece: 'Make it in two pieces.',
  lengthenLeg: 'Lengthen the leg.',
  turnWithinRange: 'Change the turn, or send a hem.',
  enterSecondPitch: 'Send the second slope.',
  enterPitch: 'Send the slope in degrees, or leave "follows" out.',
  lengthenHem: 'Lengthen the hem or leave it out.',
  enterGap: 'Send a gap, or close the hem.',
  shortenHem: 'Shorten the hem or lengthen its leg.',
  openUp: 'Open an angle, shorten a leg, or turn the bend or hem the other way.',
  narrowProfile: 'Shorten legs, or make it in two pieces.',
  widerStock: 'Choose a wider stock, or shorten legs.',
  softerRadius: 'Bend to a larger radius.',
  softerMetal: 'Bend to a larger radius, or choose a softer alloy.',
  softerPaint: 'Bend to a larger radius, or choose a more flexible paint.',
  openHem: 'Open the hem, or choose a more flexible paint.',
  closeHem: 'Close the hem, or open its gap.',
}

function partName({ bend, hem, leg }: ProfileProblem): string {
  if (bend !== null) return `Bend ${bend}`
  if (hem !== null) return `The hem at edge ${hem}`
  return leg === null ? 'The piece' : `Leg ${leg}`
}

/** The problem and what cures it, in the API's English: `Leg 2 is 1/16" long, and … Lengthen the leg.` */
export function profileProblemText(problem: ProfileProblem): string {
  const { found, limit } = problemMessage(problem, 'fraction').values
  const text = PROBLEMS[problem.code]
    .replace('{part}', partName(problem))
    .replace('{found}', found)
    .replace('{limit}', limit)
  return `${text} ${CURES[problem.cure]}`
}
