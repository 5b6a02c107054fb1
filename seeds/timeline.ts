/** Something done on a day of the demo practice's past. */
export interface Step {
  /** Days before the present one. */
  readonly daysAgo: number;
  readonly run: (today: string) => unknown;
}

const DAY = 86_400_000;
const MINUTE = 60_000;
/** Work starts at three in the afternoon UTC, morning in Minnesota. */
const MORNING = 15 * 60 * MINUTE;

/** The ISO date so many days before `now`. */
export const dateOf = (now: number, daysAgo: number) => new Date(now - daysAgo * DAY).toISOString().slice(0, 10);

/**
 * Does every step on its day, oldest first and steps of one day in the order given, a quarter of an hour apart.
 * `setClock` is told the time (milliseconds since 1970) before each.
 */
export async function runTimeline(
  steps: readonly Step[],
  options: { readonly now: number; readonly setClock: (time: number) => void },
): Promise<void> {
  const midnight = Math.floor(options.now / DAY) * DAY;
  const doneOn = new Map<number, number>();
  for (const { daysAgo, run } of [...steps].sort((a, b) => b.daysAgo - a.daysAgo)) {
    if (daysAgo < 1) throw new RangeError(`A step of the demo practice lies ${-daysAgo} days ahead of the present.`);
    const before = doneOn.get(daysAgo) ?? 0;
    doneOn.set(daysAgo, before + 1);
    options.setClock(midnight - daysAgo * DAY + MORNING + before * 15 * MINUTE);
    await run(dateOf(options.now, daysAgo));
  }
}
