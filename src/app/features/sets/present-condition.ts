import type { ConditionEntry } from '../../../contracts/sets';
import { PARTS_OF_KIND, SET_PARTS, type SetKind, type SetPart } from '../../../domain/sets/terms';

export interface PartCondition {
  readonly part: SetPart;
  /** The newest entry; none where the part was never graded. */
  readonly entry: ConditionEntry | undefined;
}

/**
 * The parts of a kind in the order of an inspection, each with its newest entry; parts graded under another kind come
 * too, so that nothing on record is hidden.
 */
export function presentCondition(kind: SetKind, newestFirst: readonly ConditionEntry[]): PartCondition[] {
  return SET_PARTS.map((part) => ({ part, entry: newestFirst.find((entry) => entry.part === part) })).filter(
    ({ part, entry }) => PARTS_OF_KIND[kind].includes(part) || entry !== undefined,
  );
}
