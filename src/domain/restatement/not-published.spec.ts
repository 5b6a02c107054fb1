import { SAMPLE, seriesOf } from '../../../tests/support/sample-series';
import type { Period } from '../calendar/period';
import { describeNotPublished, notPublished } from './not-published';

describe('a period without a published figure, in words', () => {
  it.each([
    ['2025-10', 'No figure was ever published for Oct 2025. The nearest published: Sep 2025 and Nov 2025.'],
    ['2026', 'No annual average is published for 2026, though some of its months are. The nearest published: 2025.'],
    ['2026-12', 'No figure is published yet for Dec 2026. The nearest published: May 2026.'],
    ['1800', 'The index begins after 1800. The nearest published: 1929.'],
  ])('%s', (period, words) => {
    expect(describeNotPublished(notPublished(SAMPLE, period as Period, 'from'))).toBe(words);
  });

  it('names no neighbours where there are none', () => {
    const failure = notPublished(seriesOf({}), '1941' as Period, 'to');
    expect(failure).toMatchObject({ reason: 'never-published', neighbours: [] });
    expect(describeNotPublished(failure)).toBe('No figure was ever published for 1941.');
  });
});
