import { composeServices } from '../server/composition';
import { allOrNothing } from '../server/db/all-or-nothing';
import type { OpenDatabase } from '../server/db/client';
import type { ReferenceData } from '../server/reference-data/reference-data';
import { ESTIMATES } from './estimates';
import { openPractice } from './opening';
import { SETS } from './sets';
import { drawAll, stepsOf } from './steps';
import { runTimeline, timeOf } from './timeline';

export { DEMO_ACCOUNTS, DEMO_PASSWORD } from './people';

/** Days ago on which the practice opened, before its first set came in. */
const OPENED = 730;

/**
 * Fills an empty database with the demo practice, as its people would have over the past two years: through the
 * services, each step on its own day. The same `now` gives the same records, password hashes apart.
 *
 * All or nothing: a start that is stopped half-way leaves the database empty, and the next start begins again.
 */
export async function seedDemoPractice(deps: {
  readonly database: OpenDatabase;
  readonly referenceData: ReferenceData;
  readonly fontsFolder: string;
  /** Milliseconds since 1970. */
  readonly now: number;
}): Promise<void> {
  let clock = timeOf(deps.now, OPENED);
  const services = composeServices({ ...deps, now: () => clock });
  const pictures = await drawAll(SETS);
  await allOrNothing(deps.database, async () => {
    const practice = await openPractice(services);
    await runTimeline(stepsOf({ services, practice, sets: SETS, estimates: ESTIMATES, pictures }), {
      now: deps.now,
      setClock: (time) => (clock = time),
    });
  });
}
