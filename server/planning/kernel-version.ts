/**
 * Names the state of strip and planner in frozen lines and in the keys of kept plans. Raise it with
 * every change of shared/strip or shared/bend-plan that changes an answer.
 */
export const KERNEL_VERSION = 5
