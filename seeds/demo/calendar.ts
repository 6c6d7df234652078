const DAY = 86_400_000

/** The shop's days around the day of seeding. Hours are UTC; the shop works 13:00 to 22:00. */
export interface Calendar {
  /** A moment on the working day so many before (below 0) or after today. */
  readonly moment: (workingDay: number, time: string) => Date
  /** The day as `YYYY-MM-DD`. */
  readonly day: (workingDay: number) => string
}

const isWorkingDay = (moment: number): boolean => ![0, 6].includes(new Date(moment).getUTCDay())

/** Counts working days, Monday to Friday, from the day of `now`, which may be on a weekend itself. */
export function createCalendar(now: Date): Calendar {
  const today = Date.UTC(now.getUTCFullYear(), now.getUTCMonth(), now.getUTCDate())
  const midnight = (workingDay: number): number => {
    const step = Math.sign(workingDay) * DAY
    let found = today
    for (let left = Math.abs(workingDay); left > 0;) {
      found += step
      if (isWorkingDay(found)) left -= 1
    }
    return found
  }
  const day = (workingDay: number): string =>
    new Date(midnight(workingDay)).toISOString().slice(0, 10)
  return { day, moment: (workingDay, time) => new Date(`${day(workingDay)}T${time}:00.000Z`) }
}
