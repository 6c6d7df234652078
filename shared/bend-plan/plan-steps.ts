import { foldSetup } from './fold-setup'
import type { FoldGround } from './fold-setup'
import { gaugeDistance, restsOn } from './gauge-stop'
import { getOrientation, moveBetween, rearSide } from './orientation'
import type { Orientation } from './orientation'
import type { PlanStep } from './plan.schema'
import { scaleAngle } from './scale-angle'
import type { Operation } from './search-ground'
import { withSeconds } from './step-seconds'

/** A sequence as the steps a bender reads. */
export const planSteps = (ground: FoldGround, operations: readonly Operation[]): PlanStep[] => {
  let made = 0
  let before: Orientation | undefined
  const steps = operations.map((operation) => {
    const bend = ground.piece.bends[operation.bend]
    if (bend === undefined) throw new RangeError(`No bend ${operation.bend}.`)
    const orientation = getOrientation(operation.orientation)
    const setup = foldSetup(ground, made, bend, orientation)
    const gauge = ground.brake.gauge === null ? null : gaugeDistance(setup.rear.chain)
    const step: PlanStep = {
      bend: bend.fold,
      leftUp: orientation.leftUp,
      aBack: orientation.aBack,
      move: before === undefined ? 'load' : moveBetween(before, orientation),
      direction: setup.direction,
      angle: Math.abs(bend.turn),
      swing: setup.swing,
      hits: bend.hem === null ? 1 : 2,
      gauge,
      restsOn: gauge === null ? null : restsOn(ground.piece, bend, rearSide(orientation), made),
      gaugeSetting: gauge,
      scaleAngle: scaleAngle(bend, setup.swing, ground.brake),
      seconds: null,
    }
    before = orientation
    made |= 1 << bend.index
    return step
  })
  return withSeconds(steps, ground.brake)
}
