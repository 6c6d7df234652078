import { stepPictures, type StepPicture } from '#shared/bend-plan/plan-pictures'
import type { Run } from '#shared/runs/runs.contract'

/** The piece in the brake at each hit of a run's frozen plan; the longest piece stands for all. */
export const picturesOfRun = (run: Run): readonly StepPicture[] =>
  stepPictures(run.plan, {
    section: run.plan.section,
    sheet: run.stock.sheet,
    brake: run.brake,
    pieceLength: Math.max(...run.lengths.map(({ length }) => length)),
    paintedSide: run.profile.colorSide,
  })
