import type { Role } from '../access/policy';
import type { Period } from '../calendar/period';
import type { Line } from '../estimate/line';
import type { TaxTreatment } from '../estimate/terms';
import type { Totals } from '../estimate/totals';
import type { Verdict } from '../estimate/verdict';
import type { Restatement } from '../restatement/restate';
import type { Hazard } from '../sets/hazards';
import type { SetKind, SetPart, ValueType, WorthKind } from '../sets/terms';

/** What documents are written from. Amounts are decimal strings, dates ISO dates. */

export interface PracticeForPaper {
  readonly name: string;
  /** Lines of text, may be empty. */
  readonly address: string;
  readonly phone: string;
  readonly email: string;
}

/** Who prepared a document; a null role is the practice itself, writing from its records. */
export interface Preparer {
  readonly name: string;
  readonly role: Role | null;
}

interface Money {
  readonly amount: string;
  readonly currency: string;
}

export interface WorthForPaper {
  readonly id: number;
  /** ISO instant. */
  readonly recordedAt: string;
  readonly kind: WorthKind;
  readonly amount: Money;
  readonly low: Money | null;
  readonly high: Money | null;
  readonly valueType: ValueType;
  readonly effectiveOn: string;
  readonly saidBy: string;
  readonly basis: string;
}

export interface HazardForPaper {
  readonly hazard: Hazard;
  readonly volts: number | null;
  readonly note: string;
}

export interface PriceForPaper {
  readonly amount: string;
  readonly currency: string;
  readonly period: Period;
  readonly source: string;
}

export interface SetForPaper {
  readonly number: string;
  readonly kind: SetKind;
  readonly maker: string;
  readonly model: string;
  readonly description: string;
  readonly chassis: string;
  readonly serial: string;
  readonly year: number | null;
  readonly ownerName: string | null;
  readonly priceWhenNew: PriceForPaper | null;
  readonly provenance: string;
  readonly alterations: string;
  readonly hazards: readonly HazardForPaper[];
  /** Newest first; the first of a part is its present condition. */
  readonly condition: readonly {
    readonly part: SetPart;
    readonly grade: number;
    readonly note: string;
    readonly notedOn: string;
  }[];
  readonly worths: readonly WorthForPaper[];
}

/** The price when new in the newest month's money, or why that is unknown. */
export type RestatedForPaper =
  | {
      readonly known: true;
      readonly restatement: Restatement;
      readonly series: {
        readonly title: string;
        readonly publisher: string;
        readonly publisherSeriesId: string;
        readonly base: string;
        readonly release: string;
        readonly first: Period;
        readonly last: Period;
      };
      readonly curve: readonly { readonly period: Period; readonly amount: string }[];
    }
  | { readonly known: false; readonly reason: string };

export interface EstimateForPaper {
  readonly number: string;
  readonly title: string;
  readonly taxTreatment: TaxTreatment;
  readonly taxRatePercent: string;
  readonly taxNote: string;
  readonly depositPercent: string;
  readonly notes: string;
  readonly set: Pick<SetForPaper, 'number' | 'kind' | 'maker' | 'model' | 'year' | 'ownerName' | 'hazards' | 'worths'>;
  /** In the order of the job: by stage, then as placed. */
  readonly lines: readonly {
    readonly content: Line;
    readonly net: string;
    readonly netLow: string;
    readonly netHigh: string;
  }[];
  readonly totals: Totals;
  /** Null where a worth is not on record. */
  readonly verdict: Verdict | null;
}
