import { TestBed } from '@angular/core/testing';
import { costAgainstWorthSentence, type CostAgainstWorthFigures } from '../../domain/charts/cost-against-worth';
import { CostAgainstWorth } from './cost-against-worth';

const FIGURES: CostAgainstWorthFigures = {
  currency: 'USD',
  asFound: 650,
  asRestored: 2250,
  restoredLow: 2000,
  restoredHigh: 2500,
  cost: { low: 900, likely: 1200, high: 1900 },
};

function draw(figures: CostAgainstWorthFigures): HTMLElement {
  const fixture = TestBed.createComponent(CostAgainstWorth);
  fixture.componentRef.setInput('figures', figures);
  fixture.detectChanges();
  return fixture.nativeElement as HTMLElement;
}

it('is one picture that says its sentence', () => {
  const picture = draw(FIGURES).querySelector('[role="img"]');
  expect(picture?.getAttribute('aria-label')).toBe(costAgainstWorthSentence(FIGURES));
});

it('draws a range, a whisker and their key only where there are any', () => {
  const ranged = draw(FIGURES);
  expect(ranged.querySelectorAll('rect.range, path.whisker, .key .range')).toHaveLength(3);
  const exact = draw({
    ...FIGURES,
    restoredLow: null,
    restoredHigh: null,
    cost: { low: 1200, likely: 1200, high: 1200 },
  });
  expect(exact.querySelectorAll('rect.range, path.whisker, .key .range')).toHaveLength(0);
});

it('hatches a gain and a loss apart, and two charts do not share their hatches', () => {
  const fills = (figures: CostAgainstWorthFigures) =>
    [...draw(figures).querySelectorAll('rect[fill]')].map((bar) => bar.getAttribute('fill') ?? '');
  const gain = fills(FIGURES);
  const loss = fills({ ...FIGURES, cost: { low: 1700, likely: 2000, high: 2600 } });
  expect(gain.some((fill) => fill.endsWith('-gain)'))).toBe(true);
  expect(loss.some((fill) => fill.endsWith('-loss)'))).toBe(true);
  expect(gain.filter((fill) => loss.includes(fill))).toEqual([]);
});
