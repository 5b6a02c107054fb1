import type { DemoEstimate } from './estimate-lines';
import { OTHER_ESTIMATES } from './estimates-others';
import { RADIO_ESTIMATES } from './estimates-radios';

/** Every estimate of the demo practice: gains, losses, near even, and one where no restored worth is on record. */
export const ESTIMATES: readonly DemoEstimate[] = [...RADIO_ESTIMATES, ...OTHER_ESTIMATES];
