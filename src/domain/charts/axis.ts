/** A money axis from zero: its end and the amounts of its grid lines, at most `most` of them besides zero. */
export interface MoneyAxis {
  readonly end: number;
  readonly lines: readonly number[];
}

/**
 * Round steps of 1, 2, 2.5 or 5 times a power of ten, as few as reach the largest amount with at most `most` lines.
 * @param largest in currency units, zero or more
 */
export function moneyAxis(largest: number, most = 5): MoneyAxis {
  const least = Math.max(largest, 1) / most;
  const power = 10 ** Math.floor(Math.log10(least));
  const step = [1, 2, 2.5, 5, 10].map((n) => n * power).find((s) => s >= least * (1 - 1e-9)) ?? 10 * power;
  const lines: number[] = [];
  for (let n = 0; n * step < largest; n++) lines.push(n * step);
  lines.push(lines.length * step);
  return { end: lines.at(-1) ?? step, lines };
}
