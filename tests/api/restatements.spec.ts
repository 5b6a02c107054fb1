import fc from 'fast-check';
import { restatement } from '../../src/contracts/restatements';
import { seriesSummary, toIndexSeries } from '../../src/contracts/series';
import { PROBLEMS } from '../../src/contracts/problem';
import type { Period } from '../../src/domain/calendar/period';
import type { PlainDecimal } from '../../src/domain/money/money';
import { restate } from '../../src/domain/restatement/restate';
import { expectOk } from '../../src/domain/result';
import { startTestApp, type TestApp } from '../support/harness';

let test: TestApp;
beforeAll(async () => {
  test = await startTestApp({ people: false });
});
afterAll(() => test.close());

const ask = (query: string) => test.anyone().get(`/api/restatements${query}`);
const asked = (changes: Record<string, string> = {}) =>
  `?${new URLSearchParams({ series: 'us-cpi-u', amount: '39.95', from: '1938', to: '2021', ...changes }).toString()}`;

interface Body {
  readonly type?: string;
  readonly neighbours?: string[];
  readonly fields?: { field: string; value?: string; message: string }[];
}

describe('GET /api/restatements', () => {
  it('answers figures, factor, amounts, both bands and the basis', async () => {
    const reply = await ask(asked())
      .expect(200)
      .expect('Content-Type', /^application\/json/);
    // 39.95 × 270.970 ÷ 14.1 and its bands, computed apart with Python's decimal module
    expect(reply.body).toEqual({
      series: 'us-cpi-u',
      release: '2026-07',
      from: { period: '1938', index: '14.1' },
      to: { period: '2021', index: '270.970' },
      factor: '19.21773049645390070921985815602836879433',
      original: { amount: '39.95', currency: 'USD' },
      restated: { amount: '767.75', currency: 'USD' },
      bands: { rounding: { low: '765.03', high: '770.48' }, withinYear: { low: '762.34', high: '773.23' } },
      basis:
        'Price × 270.970 (2021 average) ÷ 14.1 (1938 average); US Bureau of Labor Statistics, CPI-U, all items, ' +
        'US city average, not seasonally adjusted, CUUR0000SA0, 1982-84=100; release 2026-07.',
    });
  });

  it('takes the newest published month for a target left out', async () => {
    const { body } = (await ask('?series=us-cpi-u&amount=1&from=1941').expect(200)) as { body: unknown };
    expect(body).toMatchObject({ to: { period: '2026-07', index: '333.918' } });
  });

  it('keeps the figures’ trailing zeros and has no band within a month', async () => {
    const reply = await ask(asked({ from: '2025-09', to: '2026-04' })).expect(200);
    expect(reply.body).toMatchObject({
      from: { index: '324.800' },
      to: { index: '333.020' },
      bands: { withinYear: null },
    });
  });

  it('leaves a price in its own period unchanged, with closed bands', async () => {
    const reply = await ask(asked({ from: '1938', to: '1938' })).expect(200);
    const closed = { low: '39.95', high: '39.95' };
    expect(reply.body).toMatchObject({
      factor: '1',
      restated: { amount: '39.95' },
      bands: { rounding: closed, withinYear: closed },
    });
  });

  it('shows falling prices and works backwards', async () => {
    await ask(asked({ amount: '100', from: '1929', to: '1933' })).expect(200, /"amount":"76\.02"/);
    await ask(asked({ amount: '446.66', from: '2007', to: '1939' })).expect(200, /"amount":"29\.94"/);
  });

  it.each([
    ['999999999.9999', '999999999.9999'],
    ['0', '0'],
    ['0.00', '0.00'],
    ['007.5', '7.5'],
    ['0.0625', '0.0625'],
  ])('takes %s as an amount', async (amount, echoed) => {
    const reply = await ask(asked({ amount })).expect(200);
    expect(reply.body).toMatchObject({ original: { amount: echoed, currency: 'USD' } });
  });

  it('lets 2025 stand by its published average, with the note', async () => {
    await ask(asked({ to: '2025' })).expect(200, /2025 average: the publisher’s mean of the eleven months/);
  });

  it('sets no cookie, and tells an unchanged answer from a new one', async () => {
    const first = await ask(asked()).expect(200);
    expect(first.headers['set-cookie']).toBeUndefined();
    await ask(asked()).set('If-None-Match', String(first.headers['etag'])).expect(304);
  });

  it.each([
    ['from', '2025-10', ['2025-09', '2025-11']],
    ['to', '2025-10', ['2025-09', '2025-11']],
    ['from', '2026', ['2025']],
    ['to', '2026', ['2025']],
    ['to', '2026-08', ['2026-07']],
    ['to', '9999', ['2025']],
    ['from', '1912', ['1913']],
    ['from', '1912-12', ['1913-01']],
    ['from', '0000', ['1913']],
    ['from', '1941-Q2', ['1941-04', '1941-06']],
  ])('refuses %s %s as not published, naming the nearest', async (field, period, neighbours) => {
    const reply = await ask(asked({ [field]: period })).expect(422);
    expect(reply.headers['content-type']).toMatch(/^application\/problem\+json/);
    const body = reply.body as Body;
    expect(body).toMatchObject({ status: 422, title: PROBLEMS['period-not-published'].title, neighbours });
    expect(body.type).toMatch(/period-not-published$/);
    expect(body.fields).toMatchObject([{ field, value: period }]);
  });

  it.each([
    ['amount', 'a sign', '-1'],
    ['amount', 'a plus', '+1'],
    ['amount', 'an exponent', '1e3'],
    ['amount', 'grouping', '1,000'],
    ['amount', 'a currency sign', '$5'],
    ['amount', 'a bare point', '5.'],
    ['amount', 'no digits before the point', '.5'],
    ['amount', 'ten digits', '1234567890'],
    ['amount', 'five decimals', '1.00001'],
    ['amount', 'an absurd length', '9'.repeat(3000)],
    ['amount', 'infinity', 'Infinity'],
    ['amount', 'not a number', 'NaN'],
    ['amount', 'hexadecimal', '0x10'],
    ['amount', 'other digits', '٣٩'],
    ['amount', 'blanks', ' 1 '],
    ['amount', 'a line break', '1\n'],
    ['amount', 'a null byte', '1\u0000'],
    ['amount', 'nothing', ''],
    ['from', 'no such month', '1938-13'],
    ['from', 'month zero', '1938-00'],
    ['from', 'a month of one digit', '1938-1'],
    ['from', 'a day', '1938-05-14'],
    ['from', 'a fifth quarter', '1938-Q5'],
    ['from', 'a word', 'now'],
    ['from', 'a year of five digits', '19380'],
    ['from', 'a negative year', '-1938'],
    ['from', 'nothing', ''],
    ['to', 'no such month', '2021-13'],
    ['to', 'nothing', ''],
    ['to', 'an absurd length', '2'.repeat(3000)],
    ['series', 'unknown', 'us-cpi-w'],
    ['series', 'the older base', 'us-cpi-u-1967'],
    ['series', 'a name every object has', '__proto__'],
    ['series', 'nothing', ''],
    ['series', 'an absurd length', 's'.repeat(3000)],
  ])('cannot use as %s: %s', async (field, _what, value) => {
    const reply = await ask(asked({ [field]: value })).expect(400);
    expect(reply.headers['content-type']).toMatch(/^application\/problem\+json/);
    const body = reply.body as Body;
    expect(body.type).toMatch(/invalid-input$/);
    expect(body.fields?.map((problem) => problem.field)).toEqual([field]);
    expect(body.fields?.[0]?.message.length).toBeGreaterThan(10);
    expect(body.fields?.[0]?.value?.length ?? 0).toBeLessThanOrEqual(81);
  });

  it.each(['series', 'amount', 'from'])('needs %s', async (field) => {
    const query = new URLSearchParams(asked());
    query.delete(field);
    const { fields } = (await ask(`?${query.toString()}`).expect(400)).body as Body;
    expect(fields).toEqual([{ field, message: 'This is needed.' }]);
  });

  it.each(['series', 'amount', 'from', 'to'])('takes %s once', async (field) => {
    const { fields } = (await ask(`${asked()}&${field}=1941`).expect(400)).body as Body;
    expect(fields).toMatchObject([{ field, message: 'Send this once.' }]);
  });

  it('names every field at once', async () => {
    const { fields } = (await ask('?series=&amount=x&from=y&to=z').expect(400)).body as Body;
    expect(fields?.map(({ field }) => field)).toEqual(expect.arrayContaining(['amount', 'from', 'to']));
  });

  it.each([
    '?amount=%E0%A4%A&from=%',
    '?amount[]=1&from[x]=1938&series=us-cpi-u',
    '?%00=%FF',
    '?&&=&=',
    `?${'a=1&'.repeat(2000)}`,
  ])('answers 400 to the address %.40s', async (query) => {
    await ask(query)
      .expect(400)
      .expect('Content-Type', /problem\+json/);
  });

  it('answers nothing but 200, 400 and 422, whatever is sent', async () => {
    const likely = fc.constantFrom('us-cpi-u', '1938', '2026', '2025-10', '39.95', '0', '1e9', '../..', '{"$gt":1}');
    const value = fc.oneof(likely, fc.string({ unit: 'binary', maxLength: 40 }));
    const query = fc.record({
      series: fc.oneof(fc.constant('us-cpi-u'), value),
      amount: value,
      from: value,
      to: value,
    });
    await fc.assert(
      fc.asyncProperty(query, async (parts) => {
        const reply = await ask(asked(parts));
        expect([200, 400, 422]).toContain(reply.status);
        if (reply.status === 200) restatement.parse(reply.body);
      }),
      { numRuns: 150 },
    );
  });
});

describe('GET /api/series', () => {
  it('lists the index with publisher, base, range, release and what was never published', async () => {
    const reply = await test.anyone().get('/api/series').expect(200);
    expect(reply.body).toMatchObject({
      total: 1,
      items: [
        {
          id: 'us-cpi-u',
          publisher: 'US Bureau of Labor Statistics',
          publisherSeriesId: 'CUUR0000SA0',
          country: 'US',
          currency: 'USD',
          base: '1982-84=100',
          first: '1913-01',
          last: '2026-07',
          lastYear: '2025',
          release: '2026-07',
          missing: ['2025-10'],
        },
      ],
    });
  });
});

describe('GET /api/series/:id/figures', () => {
  it('gives every published figure, so that a preview computes what the server does', async () => {
    const { items } = (await test.anyone().get('/api/series').expect(200)).body as { items: unknown[] };
    const { figures } = (await test.anyone().get('/api/series/us-cpi-u/figures').expect(200)).body as {
      figures: { period: string; index: string }[];
    };
    expect(figures).toHaveLength(1362 + 113);
    const series = toIndexSeries(seriesSummary.parse(items[0]), figures);
    const from = '1941' as Period;
    const preview = expectOk(restate({ series, amount: '169.95' as PlainDecimal, from, to: '2026-07' as Period }));
    const { body } = (await ask(asked({ amount: '169.95', from, to: '2026-07' }))) as { body: unknown };
    expect(body).toMatchObject({
      factor: preview.factor,
      restated: { amount: preview.restated },
      bands: { rounding: preview.rounding, withinYear: preview.withinYear },
      basis: preview.basis,
    });
  });

  it.each(['us-cpi-u-1967', 'constructor', '%00', '%E0%A4%A', 'x'.repeat(500)])('has nothing at %.20s', async (id) => {
    const reply = await test.anyone().get(`/api/series/${id}/figures`);
    expect([400, 404]).toContain(reply.status);
    expect(reply.headers['content-type']).toMatch(/^application\/problem\+json/);
  });
});
