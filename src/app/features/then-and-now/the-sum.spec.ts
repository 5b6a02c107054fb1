import { TestBed } from '@angular/core/testing';
import { toIndexSeries } from '../../../contracts/series';
import type { Period } from '../../../domain/calendar/period';
import type { PlainDecimal } from '../../../domain/money/money';
import { restate } from '../../../domain/restatement/restate';
import { expectOk } from '../../../domain/result';
import { provideIcons } from '../../ui/provide-icons';
import { FIGURES, SERIES } from './testing';
import { TheSum } from './the-sum';

function words(from: string, to: string): string {
  const series = toIndexSeries(SERIES, FIGURES);
  const amount = '169.95' as PlainDecimal;
  const value = expectOk(restate({ series, amount, from: from as Period, to: to as Period }));
  TestBed.configureTestingModule({ providers: [provideIcons()] });
  const fixture = TestBed.createComponent(TheSum);
  fixture.componentRef.setInput('shown', { ...value, series: SERIES.id, release: SERIES.release, currency: 'USD' });
  fixture.componentRef.setInput('citation', 'Cited.');
  fixture.detectChanges();
  return ((fixture.nativeElement as HTMLElement).textContent ?? '').replace(/\s+/g, ' ');
}

it('writes the sum out and each band in a sentence of its own', () => {
  const text = words('1941', '2026-05');
  expect(text).toContain('$169.95paid in 1941×335.123May 2026÷14.71941 average=$3,874.43restated');
  expect(text).toContain('so the result lies from $3,861 to $3,888; that is why it reads about $3,870.');
  // 169.95 × 335.123 ÷ 15.5 and ÷ 14.1, the year's highest and lowest month among these figures
  expect(text).toContain('paid when prices stood highest in 1941 it would come to $3,674, when lowest to $4,039.');
});

it('has nothing to say about the months of a price dated by a month', () => {
  expect(words('1941-12', '2026-05')).not.toContain('without a month');
});

it('leaves nothing open between equal periods', () => {
  const text = words('1941', '1941');
  expect(text).toContain('Both periods are the same, so nothing is restated and nothing is left open.');
  expect(text).not.toContain('without a month');
});
