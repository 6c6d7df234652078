import type { PlanReason } from '#shared/bend-plan/plan.schema'
import { reasonText, type ReasonText } from '#shared/bend-plan/reason-text'
import { printAngle } from '#shared/units/angle'
import { printSize } from '#shared/units/print-length'

/** Parts in braces are filled with the values of the reason. */
const REASONS: Record<ReasonText['key'], string> = {
  length: 'the piece is {found} long and the brake takes {limit}',
  thickness: 'the sheet is {found} thick and the brake bends up to {limit} of this metal',
  metal: 'the brake does not bend this metal',
  direction: '{bend} folds down and the brake only folds up',
  hemSide: 'the lip of {bend} would be on the wrong side',
  policy: '{bend} would come before a hem',
  angleBend: '{bend} needs a swing of {found} and the brake swings to {limit}',
  angleHemShort: '{bend} has a lip of {found} and the brake needs {limit}',
  angleHemLong: '{bend} has a lip of {found} and the brake takes {limit}',
  flange: '{bend} leaves {found} of flat sheet in front and the brake needs {limit}',
  clamp: '{bend} leaves {found} of flat sheet to clamp and the brake needs {limit}',
  throat: '{bend} puts {found} behind the clamp and the brake has room for {limit}',
  gauge: '{bend} would be gauged at {found} and the gauge stops at {limit}',
  rearMeetsTool: 'at {bend} what lies behind it meets the clamp',
  rearMeetsToolOver:
    'at {bend} what lies behind it meets the clamp and {overlap} less at edge {edge} would clear it',
  frontMeetsTool: 'at {bend} the part that swings up meets the brake',
  frontMeetsToolOver:
    'at {bend} the part that swings up meets the brake and {overlap} less at edge {edge} would clear it',
  meetsItself: 'at {bend} the piece meets itself',
  meetsItselfOver:
    'at {bend} the piece meets itself and {overlap} less at edge {edge} would clear it',
  apronMeetsRear: 'at {bend} the apron meets what is bent behind it',
  apronMeetsRearOver:
    'at {bend} the apron meets what is bent behind it and {overlap} less at edge {edge} would clear it',
  cannotLoad: 'for {bend} the piece does not go into the brake',
  cannotLoadOver:
    'for {bend} the piece does not go into the brake and would with {overlap} less at edge {edge}',
  trapped: 'after {bend} the piece would be trapped in the brake',
  trappedOver:
    'after {bend} the piece would be trapped in the brake and would come out with {overlap} less at edge {edge}',
  noOrder: 'no order of single full folds works; a bender may know a two-stage way',
  limit: 'the search stopped before it was certain',
}

function foldName(fold: PlanReason['bend']): string {
  if (fold === 'hemA' || fold === 'hemB') return `the hem at edge ${fold.slice(-1)}`
  return fold === null ? 'a fold' : `bend ${fold}`
}

/** Why a brake does not bend it, in the API's English. */
export function planReasonText(reason: PlanReason): string {
  const { key, unit, overlap } = reasonText(reason)
  const print = (value: number | null): string => {
    if (value === null) return 'some'
    return unit === 'degrees' ? printAngle(value) : printSize(value, 'fraction', 64)
  }
  return REASONS[key]
    .replace('{bend}', foldName(reason.bend))
    .replace('{found}', print(reason.found))
    .replace('{limit}', print(reason.limit))
    .replace('{overlap}', print(overlap))
    .replace('{edge}', reason.edge ?? '')
}
