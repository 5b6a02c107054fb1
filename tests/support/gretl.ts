import { execFileSync } from 'node:child_process';
import { existsSync, mkdirSync, readdirSync, readFileSync, renameSync } from 'node:fs';
import { join } from 'node:path';
import { gunzipSync } from 'node:zlib';
import { ROOT } from './root';

/** Where Debian's gretl-data lies unpacked, or why it does not. */
export type GretlData =
  { readonly available: true; readonly folder: string } | { readonly available: false; readonly reason: string };

/**
 * Debian's `gretl-data` package, downloaded and unpacked (never installed) below `.scratch`, once. It is under the GPL,
 * so its files are read when the tests run and are no part of this project.
 */
export function openGretlData(): GretlData {
  const scratch = join(ROOT, '.scratch/gretl-data');
  const folder = join(scratch, 'unpacked/usr/share/gretl/data');
  if (existsSync(folder)) return { available: true, folder };
  try {
    mkdirSync(scratch, { recursive: true });
    run('apt-get', ['download', 'gretl-data'], scratch);
    const archive = readdirSync(scratch).find((file) => file.endsWith('.deb'));
    if (archive === undefined) return { available: false, reason: 'apt-get downloaded no package' };
    run('dpkg-deb', ['-x', archive, 'unpacking'], scratch);
    renameSync(join(scratch, 'unpacking'), join(scratch, 'unpacked')); // so that a broken-off unpacking is no data
    return { available: true, folder };
  } catch (error) {
    return { available: false, reason: `apt cannot give gretl-data here (${lastLine(error)})` };
  }
}

const run = (command: string, args: string[], cwd: string) =>
  execFileSync(command, args, { cwd, stdio: ['ignore', 'ignore', 'pipe'], timeout: 45_000 });

function lastLine(error: unknown): string {
  const text = String((error as { stderr?: Buffer }).stderr ?? '').trim() || String((error as Error).message);
  return text.split('\n').at(-1) ?? '';
}

/** One variable of a gretl file as period → value; quarters are named by their last month (`1950-03`). */
export function readGretlVariable(folder: string, file: string, variable: string): Map<string, string> {
  const bytes = readFileSync(join(folder, file));
  const text = (bytes.readUInt16BE(0) === 0x1f8b ? gunzipSync(bytes) : bytes).toString('utf8');
  const column = Array.from(text.matchAll(/<variable name="([^"]+)"/g), ([, name]) => name).indexOf(variable);
  if (column === -1) throw new Error(`${file} has no variable ${variable}`);
  const frequency = Number(/frequency="(\d+)"/.exec(text)?.[1]);
  const [year, part = 1] = (/startobs="([\d:]+)"/.exec(text)?.[1] ?? '').split(':').map(Number);
  if (year === undefined) throw new Error(`${file} names no first observation`);
  const rows = Array.from(text.matchAll(/<obs[^>]*>([^<]*)<\/obs>/g), ([, row = '']) => row.trim().split(/\s+/));
  return new Map(rows.map((row, index) => [periodAt(frequency, year, part - 1 + index), row[column] ?? 'NA']));
}

function periodAt(frequency: number, year: number, steps: number): string {
  const inYear = year + Math.floor(steps / frequency);
  if (frequency === 1) return String(inYear);
  const lastMonth = ((steps % frequency) + 1) * (12 / frequency);
  return `${inYear}-${String(lastMonth).padStart(2, '0')}`;
}
