import { TestBed } from '@angular/core/testing';
import type { Period } from '../../../domain/calendar/period';
import { KnownPrices, type KnownPrice } from './known-prices';
import { SERIES } from './testing';

const known: KnownPrice[] = [
  {
    kind: 'radio',
    maker: 'Halloway',
    model: '41-X',
    price: { amount: '169.95', currency: 'USD', period: '1941' as Period, source: 'Dealer sheet' },
    restated: { amount: '3874.43', currency: 'USD' },
    to: '2026-05',
  },
  {
    kind: 'phonograph',
    maker: 'Ferrant & Oakes',
    model: 'No. 1',
    price: { amount: '30.00', currency: 'USD', period: '1908' as Period, source: 'Catalogue' },
    restated: null,
    to: null,
  },
];

it('lists prices when new with their scales, and asks about the one chosen', () => {
  const fixture = TestBed.createComponent(KnownPrices);
  fixture.componentRef.setInput('prices', known);
  fixture.componentRef.setInput('series', SERIES);
  const chosen: KnownPrice[] = [];
  fixture.componentInstance.choose.subscribe((price) => chosen.push(price));
  fixture.detectChanges();

  const rows = [...(fixture.nativeElement as HTMLElement).querySelectorAll('tbody tr')];
  expect(rows.map((row) => row.querySelector('.restated')?.textContent)).toEqual(['$3,874', 'Not known']);
  expect(rows[0]?.querySelector('tw-year-scale-row')?.getAttribute('aria-label')).toBe(
    'Year scale from 1913 to May 2026. $169.95 paid in 1941 is restated to $3,874 in May 2026.',
  );
  // A price from before the index has no place on the scale.
  expect(rows[1]?.querySelector('tw-year-scale-row')).toBeNull();

  rows[0]?.querySelector<HTMLButtonElement>('.set')?.click();
  expect(chosen).toEqual([known[0]]);
});
