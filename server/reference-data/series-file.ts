import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { parse } from 'csv-parse/sync';
import * as z from 'zod';
import { parsePeriod, periodKind, yearOf, type Period, type PeriodKind } from '../../src/domain/calendar/period';
import { publishedDecimals } from '../../src/domain/series/figures';
import type { IndexSeries } from '../../src/domain/series/series';

/** The meta record beside a series' figures; `data/README.md` describes it. */
const seriesMeta = z.strictObject({
  id: z.string().regex(/^[a-z0-9-]+$/),
  /** `primary` restates prices; `finer-base` is the same index on an older, finer base, for checking only. */
  role: z.enum(['primary', 'finer-base']),
  title: z.string().min(1),
  publisher: z.string().min(1),
  publisherSeriesId: z.string().min(1),
  country: z.string().length(2),
  currency: z.string().length(3),
  base: z.string().min(1),
  adjustment: z.string().min(1),
  /** How many decimals figures have from a year on; by year, ascending. */
  decimals: z.array(z.strictObject({ fromYear: z.int(), decimals: z.int().min(0).max(6) })).min(1),
  release: z.string().min(1),
  licence: z.string().min(1),
  credit: z.string().min(1),
  retrieved: z.iso.date(),
  retrievedFrom: z.string().min(1),
  sha256: z.string().regex(/^[0-9a-f]{64}$/),
  missing: z.array(z.string()),
  notes: z.record(z.string(), z.string()),
});
type SeriesMeta = z.infer<typeof seriesMeta>;

/** A series as published, with its standing. */
export interface PublishedSeries extends IndexSeries {
  readonly role: SeriesMeta['role'];
  readonly credit: string;
}

/**
 * Reads `<id>.csv` and `<id>.json` of a folder and checks them: fingerprint, ascending periods without duplicates,
 * positive figures with the decimals promised for their year, and gaps exactly where the meta record names them.
 * Throws naming the file and what is wrong.
 */
export function loadSeries(folder: string, id: string): PublishedSeries {
  const metaFile = join(folder, `${id}.json`);
  const csvFile = join(folder, `${id}.csv`);
  const meta = readMeta(metaFile);
  if (meta.id !== id) throw new Error(`${metaFile}: the id is «${meta.id}», it must be the file's name.`);
  const bytes = readFileSync(csvFile);
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  if (sha256 !== meta.sha256)
    throw new Error(`${csvFile}: the SHA-256 is ${sha256}, its meta record says ${meta.sha256}.`);
  const figures = readFigures(csvFile, bytes.toString('utf8'), meta);
  const missing = meta.missing.map((text) => toPeriod(metaFile, text));
  checkGaps(csvFile, figures, missing);
  return Object.freeze({
    id: meta.id,
    role: meta.role,
    title: meta.title,
    publisher: meta.publisher,
    publisherSeriesId: meta.publisherSeriesId,
    country: meta.country,
    currency: meta.currency,
    base: meta.base,
    release: meta.release,
    licence: meta.licence,
    credit: meta.credit,
    figures: fixedMap(figures),
    missing: Object.freeze(missing),
    notes: fixedMap(new Map(Object.entries(meta.notes).map(([period, note]) => [toPeriod(metaFile, period), note]))),
  });
}

function readMeta(file: string): SeriesMeta {
  const parsed = seriesMeta.safeParse(JSON.parse(readFileSync(file, 'utf8')));
  if (parsed.success) return parsed.data;
  throw new Error(`${file}: ${z.prettifyError(parsed.error)}`);
}

const figureRows = z.array(z.strictObject({ period: z.string(), value: z.string() }));

function readFigures(file: string, text: string, meta: SeriesMeta): Map<Period, string> {
  const rows = figureRows.parse(parse(text, { columns: true }));
  const figures = new Map<Period, string>();
  let previous = '';
  for (const [index, row] of rows.entries()) {
    const here = `${file}, line ${index + 2}`;
    if (row.period <= previous) throw new Error(`${here}: ${row.period} does not come after ${previous}.`);
    previous = row.period;
    const period = toPeriod(here, row.period);
    const expected = meta.decimals.filter(({ fromYear }) => fromYear <= yearOf(period)).at(-1)?.decimals;
    if (!/^\d+(?:\.\d+)?$/.test(row.value) || !/[1-9]/.test(row.value) || publishedDecimals(row.value) !== expected)
      throw new Error(`${here}: «${row.value}» is not a positive figure with ${expected ?? 'any'} decimals.`);
    figures.set(period, row.value);
  }
  return figures;
}

/** Every period between the first and the last of its kind is either published or declared missing, and not both. */
function checkGaps(file: string, figures: ReadonlyMap<Period, string>, missing: readonly Period[]): void {
  const gaps = (['year', 'quarter', 'month'] as const).flatMap((kind) => {
    const published = [...figures.keys()].filter((period) => periodKind(period) === kind);
    const [first, last] = [published.at(0), published.at(-1)];
    if (first === undefined || last === undefined) return [];
    return periodsBetween(kind, first, last).filter((period) => !figures.has(period as Period));
  });
  const undeclared = gaps.filter((period) => !missing.includes(period as Period));
  const untrue = missing.filter((period) => !gaps.includes(period));
  if (undeclared.length > 0) throw new Error(`${file}: ${undeclared.join(', ')} missing, but not declared so.`);
  if (untrue.length > 0) throw new Error(`${file}: ${untrue.join(', ')} declared missing, but not a gap.`);
}

const PARTS: Readonly<Record<PeriodKind, readonly string[]>> = {
  year: [''],
  quarter: ['-Q1', '-Q2', '-Q3', '-Q4'],
  month: Array.from({ length: 12 }, (_, month) => `-${String(month + 1).padStart(2, '0')}`),
};

function periodsBetween(kind: PeriodKind, first: Period, last: Period): string[] {
  const periods: string[] = [];
  for (let year = yearOf(first); year <= yearOf(last); year++)
    for (const part of PARTS[kind]) periods.push(`${year}${part}`);
  return periods.filter((period) => period >= first && period <= last);
}

function toPeriod(where: string, text: string): Period {
  const parsed = parsePeriod(text);
  if (parsed.ok) return parsed.value;
  throw new Error(`${where}: «${text}» is not a period. ${parsed.error.advice}`);
}

/** A map that throws on any attempt to change it. */
function fixedMap<K, V>(map: Map<K, V>): ReadonlyMap<K, V> {
  const refuse = (): never => {
    throw new TypeError('published figures cannot be changed');
  };
  return Object.freeze(Object.assign(map, { set: refuse, delete: refuse, clear: refuse }));
}
