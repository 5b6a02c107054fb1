import { createHash } from 'node:crypto';
import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ROOT } from '../../tests/support/root';
import type { Period } from '../../src/domain/calendar/period';
import { loadReferenceData } from './reference-data';

describe('the figures shipped', () => {
  const reference = loadReferenceData(join(ROOT, 'data'));
  const cpi = reference.seriesById('us-cpi-u');

  it('hold the US consumer price index, and nothing on its older base', () => {
    expect(reference.list.map(({ id }) => id)).toEqual(['us-cpi-u']);
    expect(reference.seriesById('us-cpi-u-1967')).toBeUndefined();
    expect(reference.seriesByCurrency('USD')).toBe(cpi);
    expect(reference.seriesByCurrency('GBP')).toBeUndefined();
  });

  it('are the publisher’s own digits, with months, years and the note on 2025', () => {
    expect(cpi?.figures.size).toBe(1362 + 113);
    expect(['1914', '1941-05', '2021', '2025-10'].map((period) => cpi?.figures.get(period as Period))).toEqual([
      '10.0',
      '14.4',
      '270.970',
      undefined,
    ]);
    expect(cpi?.missing).toEqual(['2025-10']);
    expect(cpi?.notes.get('2025' as Period)).toContain('eleven months');
  });

  it('cannot be changed', () => {
    const figures = cpi?.figures as Map<Period, string>;
    expect(() => figures.set('1941' as Period, '1')).toThrow('cannot be changed');
    expect(() => figures.delete('1941' as Period)).toThrow('cannot be changed');
    expect(() => figures.clear()).toThrow('cannot be changed');
    expect(Object.isFrozen(cpi)).toBe(true);
    expect(Object.isFrozen(cpi?.missing)).toBe(true);
  });
});

describe('a series file that is not as its meta record says', () => {
  let folder: string;
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'thenworth-data-'));
    mkdirSync(join(folder, 'series'));
  });
  afterEach(() => rmSync(folder, { recursive: true }));

  const GOOD = 'period,value\n2006,9.9\n2006-11,9.8\n2006-12,10.0\n2007,10.125\n2007-02,10.250\n';
  const META = {
    ...(JSON.parse(readFileSync(join(ROOT, 'data/series/us-cpi-u.json'), 'utf8')) as object),
    id: 'sample',
    decimals: [
      { fromYear: 2006, decimals: 1 },
      { fromYear: 2007, decimals: 3 },
    ],
    missing: ['2007-01'],
    notes: {},
  };

  function load(csv: string, meta: object = {}) {
    const sha256 = createHash('sha256').update(csv).digest('hex');
    writeFileSync(join(folder, 'series/sample.csv'), csv);
    writeFileSync(join(folder, 'series/sample.json'), JSON.stringify({ ...META, sha256, ...meta }));
    return loadReferenceData(folder);
  }

  it('loads when all is well', () => {
    expect(load(GOOD).seriesById('sample')?.figures.size).toBe(5);
  });

  it.each([
    ['another fingerprint', GOOD, { sha256: '0'.repeat(64) }, 'sample.csv: the SHA-256 is'],
    ['an id that is not the file’s name', GOOD, { id: 'other' }, 'the id is «other»'],
    ['an unknown field in the meta record', GOOD, { colour: 'red' }, 'sample.json'],
    ['an unknown role', GOOD, { role: 'spare' }, 'sample.json'],
    ['a period twice', GOOD.replace('2006-12', '2006-11'), {}, 'line 4: 2006-11 does not come after 2006-11'],
    ['periods out of order', GOOD.replace('2006-11,9.8\n2006-12,10.0', '2006-12,10.0\n2006-11,9.8'), {}, 'line 4'],
    ['a period that is none', GOOD.replace('2006-12', '2006-13'), {}, '«2006-13» is not a period'],
    ['too few decimals', GOOD.replace('10.125', '10.1'), {}, 'line 5: «10.1» is not a positive figure with 3 decimals'],
    ['too many decimals', GOOD.replace('9.8', '9.80'), {}, 'line 3: «9.80» is not a positive figure with 1 decimals'],
    ['a figure of zero', GOOD.replace('9.8', '0.0'), {}, '«0.0» is not a positive figure'],
    ['a figure that is none', GOOD.replace('9.8', '9,8'), {}, 'Invalid Record Length'],
    ['a sign', GOOD.replace('9.8', '-9.8'), {}, '«-9.8» is not a positive figure'],
    ['no figure', GOOD.replace('9.8', ''), {}, '«» is not a positive figure'],
    ['a gap that is not declared', GOOD, { missing: [] }, '2007-01 missing, but not declared so'],
    [
      'a declared gap that is none',
      GOOD,
      { missing: ['2007-01', '2006-12'] },
      '2006-12 declared missing, but not a gap',
    ],
    ['a year before its decimals are known', GOOD, { decimals: [{ fromYear: 2007, decimals: 3 }] }, 'any decimals'],
    ['no series to restate by', GOOD, { role: 'finer-base' }, 'holds no series to restate prices by'],
  ])('stops the start: %s', (_what, csv, meta, message) => {
    expect(() => load(csv, meta)).toThrow(message);
  });
});
