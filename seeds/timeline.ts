/** Something done on a day of the demo practice's past. */
export interface Step {
  /** Days before the present one. */
  readonly daysAgo: number;
  /** `today` is the day's ISO date. */
  readonly run: (today: string) => unknown;
}

const DAY = 86_400_000;
const QUARTER_HOUR = 15 * 60_000;
/** Three in the afternoon UTC: morning in Minnesota. */
const MORNING = 60 * QUARTER_HOUR;

/** When the `nth` step of the day so many days before `now` is done; milliseconds since 1970. */
export function timeOf(now: number, daysAgo: number, nth = 0): number {
  return (Math.floor(now / DAY) - daysAgo) * DAY + MORNING + nth * QUARTER_HOUR;
}

/**
 * Does every step on its day, oldest first, those of one day in the order given and a quarter of an hour apart.
 * `setClock` is told the time before each.
 */
export async function runTimeline(
  steps: readonly Step[],
  { now, setClock }: { readonly now: number; readonly setClock: (time: number) => void },
): Promise<void> {
  const doneOn = new Map<number, number>();
  for (const { daysAgo, run } of [...steps].sort((a, b) => b.daysAgo - a.daysAgo)) {
    if (daysAgo < 1) throw new RangeError(`A step of the demo practice lies ${1 - daysAgo} days too late.`);
    const nth = doneOn.get(daysAgo) ?? 0;
    doneOn.set(daysAgo, nth + 1);
    const time = timeOf(now, daysAgo, nth);
    setClock(time);
    await run(new Date(time).toISOString().slice(0, 10));
  }
}
