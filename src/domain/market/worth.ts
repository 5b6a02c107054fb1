import type { WorthKind } from '../sets/terms';

interface RecordedWorth {
  readonly kind: WorthKind;
  /** ISO date. */
  readonly effectiveOn: string;
  /** ISO instant. */
  readonly recordedAt: string;
  readonly id: number;
}

/**
 * The recorded worth of a kind that is in force: the newest effective date, then the newest recorded.
 * Undefined where none is on record; nothing stands in for it.
 */
export function worthInForce<W extends RecordedWorth>(worths: readonly W[], kind: WorthKind): W | undefined {
  const newestFirst = (a: W, b: W) =>
    compare(b.effectiveOn, a.effectiveOn) || compare(b.recordedAt, a.recordedAt) || b.id - a.id;
  return worths.filter((worth) => worth.kind === kind).sort(newestFirst)[0];
}

const compare = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);
