import type { Clock } from '#server/adapters/clock'

/** Stands still until a test moves it. */
export class FakeClock implements Clock {
  constructor(private time: Date) {}

  readonly now = (): Date => this.time

  moveBy(milliseconds: number): void {
    this.time = new Date(this.time.getTime() + milliseconds)
  }

  moveTo(time: Date): void {
    this.time = time
  }
}
