/** A record's number in the practice: `S-0042` for a set, `E-0042` for an estimate; four digits at least. */
export const formatNumber = (letter: 'S' | 'E', id: number): string => `${letter}-${String(id).padStart(4, '0')}`;

/** The id in a number as somebody may type it (`S-0042`, `s-42`, `42`), or null. */
export function idInNumber(letter: 'S' | 'E', text: string): number | null {
  const found = new RegExp(`^(?:${letter}-?)?0*([1-9]\\d{0,14})$`, 'i').exec(text.trim());
  return found?.[1] === undefined ? null : Number(found[1]);
}
