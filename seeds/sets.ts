import type { DemoSet } from './demo-set';
import { MUSEUM_SETS } from './sets-museum';
import { OKAFOR_SETS } from './sets-okafor';
import { SINGLE_SETS } from './sets-singles';
import { TRAN_SETS } from './sets-tran';
import { WORKSHOP_SETS } from './sets-workshop';

/** Every set of the demo practice. */
export const SETS: readonly DemoSet[] = [
  ...OKAFOR_SETS,
  ...TRAN_SETS,
  ...MUSEUM_SETS,
  ...SINGLE_SETS,
  ...WORKSHOP_SETS,
];
