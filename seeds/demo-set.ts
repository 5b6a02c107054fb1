import type { HazardEntry } from '../src/contracts/sets';
import type { Grade, SetKind, SetPart, ValueType } from '../src/domain/sets/terms';
import type { Shape } from './drawing-shapes';
import type { AuthorKey, OwnerKey } from './people';

/** The only makers of the invented scenario. */
export const MAKERS = [
  'Halloway',
  'Corvane',
  'Tidewell Electric',
  'Ferrant & Oakes',
  'Brackwell',
  'Penhallow',
  'Lyndmoor',
] as const;

/** Parts looked at on one day, graded, each with its note. */
export interface Inspection {
  /** Days after the set was registered. */
  readonly after: number;
  readonly parts: Readonly<Partial<Record<SetPart, readonly [Grade, string]>>>;
}

/** An amount in dollars, alone or with the low and the high end of its range. */
export type Opined = string | readonly [amount: string, low: string, high: string];

/** What one person says the set is worth on one day. */
export interface Opinion {
  /** Days after the set was registered. */
  readonly after: number;
  readonly by: AuthorKey;
  readonly basis: string;
  /** Fair market value unless said otherwise. */
  readonly valueType?: ValueType;
  readonly found?: Opined;
  readonly restored?: Opined;
}

/** A drawn picture: the whole front, its dial or horn nearer by, or the chassis from above. */
export interface Picture {
  readonly view: 'front' | 'detail' | 'chassis';
  readonly caption: string;
}

/** One set of the demo practice, as it would be typed in. */
export interface DemoSet {
  /** Days before the day the demo practice is made. */
  readonly registered: number;
  readonly owner: OwnerKey | null;
  readonly kind: SetKind;
  readonly maker: (typeof MAKERS)[number];
  readonly model: string;
  readonly description?: string;
  readonly chassis?: string;
  readonly serial?: string;
  readonly year?: number;
  /** In dollars. */
  readonly price?: readonly [amount: string, period: string, source: string];
  readonly priceIsPublic?: true;
  readonly provenance?: string;
  readonly alterations?: string;
  readonly notes?: string;
  readonly hazards?: readonly HazardEntry[];
  readonly inspections?: readonly Inspection[];
  readonly opinions?: readonly Opinion[];
  readonly shape?: Shape;
  readonly pictures?: readonly Picture[];
  /** Days after the set was registered. */
  readonly archivedAfter?: number;
}

/** How estimates name a set. */
export const nameOf = (set: Pick<DemoSet, 'maker' | 'model'>) => `${set.maker} ${set.model}`;

/** Bases that recur; each is the invented practice's own record. */
export const BASIS = {
  privateSales:
    'Three private sales noted by the practice in the two years before this date, compared by condition; a small sample.',
  auctions:
    'Four regional auction results noted by the practice in the two years before this date, buyer’s premium included.',
  asking: 'Two dealers’ asking prices noted by the practice, less a fifth; no completed sale found.',
  bench: 'Opinion from the bench, from what like sets have fetched over the practice’s own counter.',
} as const;

export const highVoltage = (volts: number, note = ''): HazardEntry => ({ hazard: 'high-voltage', volts, note });
export const storedCharge = (note = 'Filter capacitors.'): HazardEntry => ({
  hazard: 'stored-charge',
  volts: null,
  note,
});
export const originalCord = (note = 'Two-wire cord, insulation brittle.'): HazardEntry => ({
  hazard: 'mains-cord',
  volts: null,
  note,
});
export const hotChassis = (note = 'Series heaters, one side of the line on the chassis.'): HazardEntry => ({
  hazard: 'hot-chassis',
  volts: 120,
  note,
});
export const pictureTube = (volts: number, note = 'Anode, by the service sheet.'): HazardEntry => ({
  hazard: 'picture-tube',
  volts,
  note,
});
export const springMotor = (note = 'Two springs in one barrel.'): HazardEntry => ({
  hazard: 'spring-motor',
  volts: null,
  note,
});
export const asbestos = (note: string): HazardEntry => ({ hazard: 'asbestos', volts: null, note });
export const lead = (note: string): HazardEntry => ({ hazard: 'lead', volts: null, note });

/** What nearly every set fed from the mains through a transformer has. */
export const mainsSet = (volts: number, note = ''): HazardEntry[] => [highVoltage(volts, note), storedCharge()];

export const front = (caption = 'Front, as received'): Picture => ({ view: 'front', caption });
export const detail = (caption: string): Picture => ({ view: 'detail', caption });
export const chassis = (caption = 'Chassis from above'): Picture => ({ view: 'chassis', caption });
