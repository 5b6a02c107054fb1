import type { BodyOf } from '../src/contracts/contract';
import type { addLine } from '../src/contracts/estimates';
import type { Stage } from '../src/domain/estimate/terms';
import { PRACTICE } from './people';

/** A line as it is typed in. */
export type DemoLine = BodyOf<typeof addLine>['content'];

/** An estimate of the demo practice, for one set. */
export interface DemoEstimate {
  /** Maker and model. */
  readonly set: string;
  readonly title: string;
  /** Days after the set was registered. */
  readonly begun: number;
  readonly notes?: string;
  readonly lines: readonly DemoLine[];
  /** Days after the set was registered. */
  readonly archivedAfter?: number;
}

/** Labour at the practice's rate: hours at low, likely and high. */
export const labour = (stage: Stage, description: string, low: string, likely: string, high: string): DemoLine => ({
  kind: 'labour',
  stage,
  description,
  hours: { low, likely, high },
  rate: PRACTICE.labourRate,
});

/** Parts at the practice's markup. */
export const part = (stage: Stage, description: string, quantity: string, unitCost: string): DemoLine => ({
  kind: 'part',
  stage,
  description,
  quantity,
  unitCost,
  markupPercent: PRACTICE.partsMarkupPercent,
});

/** Another shop's quote at the practice's markup on outside work. */
export const outside = (stage: Stage, description: string, quote: string): DemoLine => ({
  kind: 'outside',
  stage,
  description,
  quote,
  markupPercent: PRACTICE.outsideMarkupPercent,
});

/** Hours by number of pieces, to a quarter of an hour. */
const hoursFor = (pieces: number, each: number) => (Math.round(pieces * each * 4) / 4).toFixed(2);

/** How a job begins: the order and the hours follow common practice in the trade. */
export const intake = (): DemoLine[] => [
  labour('intake', 'Receive, photograph and tag; agree what is wanted', '0.25', '0.5', '1'),
  labour('intake', 'Inspect unpowered: transformer windings, missing parts, hazards', '0.5', '0.75', '1.5'),
];

export const tubeTest = (count: number): DemoLine =>
  labour(
    'intake',
    `Test ${count} tubes and write the sheet`,
    hoursFor(count, 0.06),
    hoursFor(count, 0.09),
    hoursFor(count, 0.16),
  );

export const cord = (): DemoLine[] => [
  labour('power', 'Renew supply cord and plug, add fuse', '0.25', '0.5', '1'),
  part('power', 'Cord set, fuse holder and fuses', '1', '14.50'),
];

export const filters = (count: number, each: string): DemoLine[] => [
  labour(
    'power',
    `Renew ${count} filter capacitors, in the old cans where they show`,
    hoursFor(count, 0.25),
    hoursFor(count, 0.4),
    hoursFor(count, 0.9),
  ),
  part('power', 'Electrolytic capacitors, at or above the old voltage', String(count), each),
];

export const paperCapacitors = (count: number): DemoLine[] => [
  labour(
    'signal',
    `Renew ${count} paper capacitors, one at a time`,
    hoursFor(count, 0.12),
    hoursFor(count, 0.18),
    hoursFor(count, 0.3),
  ),
  part('signal', 'Film capacitors, 630 V', String(count), '1.35'),
];

export const resistors = (count: number): DemoLine[] => [
  labour(
    'signal',
    `Measure all resistors, renew about ${count}`,
    hoursFor(count, 0.06),
    hoursFor(count, 0.1),
    hoursFor(count, 0.25),
  ),
  part('signal', 'Resistors, 1 and 2 W', String(count), '0.38'),
];

export const controls = (): DemoLine => labour('signal', 'Clean controls, sockets and band switch', '0.25', '0.5', '1');

export const wiring = (low: string, likely: string, high: string): DemoLine[] => [
  labour('signal', 'Replace crumbling rubber-covered wire, lead by lead', low, likely, high),
  part('signal', 'Cloth-covered wire, feet', '40', '0.55'),
];

export const tube = (description: string, quantity: string, unitCost: string): DemoLine =>
  part('signal', `Tube: ${description}`, quantity, unitCost);

export const recone = (quote: string, size: string): DemoLine =>
  outside('speaker', `Recone ${size} speaker, field coil kept`, quote);

export const dialCord = (): DemoLine[] => [
  labour('speaker', 'Renew dial cord and lamps, clean the scale', '0.25', '0.75', '2'),
  part('speaker', 'Dial cord, feet, and two lamps', '1', '6.80'),
];

export const bringUp = (high = '4'): DemoLine =>
  labour('test', 'Bring up through a lamp; voltages against the chart; find faults', '0.5', '1.25', high);

export const align = (bands: string): DemoLine => labour('test', `Align: IF, then ${bands}`, '0.5', '1', '2.5');

export const soak = (hours = '8'): DemoLine =>
  labour('test', `Soak ${hours} hours, leakage check, final sheet and photographs`, '0.5', '0.75', '1');

export const cleanCabinet = (): DemoLine =>
  labour('cabinet', 'Clean and wax cabinet, keep the finish', '0.5', '1', '2');

export const cloth = (cost: string): DemoLine[] => [
  labour('cabinet', 'Fit new grille cloth, old cloth kept', '0.5', '1', '2'),
  part('cabinet', 'Grille cloth, near match, yard', '1', cost),
];

export const returnSet = (): DemoLine =>
  labour('return', 'Pack, show the owner, hand over the record', '0.25', '0.5', '1');
