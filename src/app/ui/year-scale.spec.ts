import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import type { Period } from '../../domain/calendar/period';
import type { YearScaleContent } from '../../domain/year-scale/content';
import { needleStops } from '../../domain/year-scale/stops';
import { YearScale } from './year-scale';

const period = (text: string) => text as Period;
const years = Array.from({ length: 113 }, (_, i) => period(String(1913 + i)));

const content = (from: string, to: string): YearScaleContent => ({
  first: period('1913-01'),
  last: period('2026-07'),
  from: period(from),
  to: period(to),
  price: '169.95',
  restated: '3874.43',
  currency: 'USD',
  curve: years.map((year) => ({ period: year, amount: '500.00' })),
});

@Component({
  imports: [YearScale],
  template: `<tw-year-scale
    [content]="content()"
    [stops]="stops"
    (thenChange)="set('from', $event)"
    (nowChange)="set('to', $event)"
  />`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {
  readonly content = signal(content('1941', '2026-07'));
  readonly stops = needleStops(years, period('2026-07'));
  set(end: 'from' | 'to', to: Period) {
    this.content.update((before) => ({ ...before, [end]: to }));
  }
}

let fixture: ComponentFixture<Host>;
const slider = (name: string): HTMLElement =>
  fixture.nativeElement.querySelector(`[role="slider"][aria-label="${name}"]`) as HTMLElement;
const press = (name: string, key: string, init: KeyboardEventInit = {}) => {
  const event = new KeyboardEvent('keydown', { key, cancelable: true, bubbles: true, ...init });
  slider(name).dispatchEvent(event);
  fixture.detectChanges();
  return event;
};
const ends = () => [fixture.componentInstance.content().from, fixture.componentInstance.content().to];

beforeEach(() => {
  fixture = TestBed.createComponent(Host);
  fixture.detectChanges();
});

it.each([
  ['ArrowRight', '1942'],
  ['ArrowUp', '1942'],
  ['ArrowLeft', '1940'],
  ['ArrowDown', '1940'],
  ['PageUp', '1951'],
  ['PageDown', '1931'],
  ['Home', '1913'],
  ['End', '2026-07'],
])('%s takes the then needle to %s', (key, to) => {
  expect(press('Paid in', key).defaultPrevented).toBe(true);
  expect(ends()).toEqual([to, '2026-07']);
});

it('leaves other keys and the browser’s own shortcuts alone', () => {
  expect(press('Paid in', 'Tab').defaultPrevented).toBe(false);
  expect(press('Paid in', 'ArrowLeft', { altKey: true }).defaultPrevented).toBe(false);
  expect(ends()).toEqual(['1941', '2026-07']);
});

it('halts a needle at the other one and says so in the limits', () => {
  press('Restated to', 'Home');
  expect(ends()).toEqual(['1941', '1941']);
  press('Paid in', 'PageUp');
  expect(ends()).toEqual(['1941', '1941']);
  expect(slider('Paid in').getAttribute('aria-valuemax')).toBe('1941');
  expect(slider('Restated to').getAttribute('aria-valuemin')).toBe('1941');
});

it('says year and amount, and names the month', () => {
  expect(slider('Paid in').getAttribute('aria-valuenow')).toBe('1941');
  expect(slider('Paid in').getAttribute('aria-valuetext')).toBe('Paid in 1941: $169.95');
  expect(slider('Restated to').getAttribute('aria-valuetext')).toBe('Restated to Jul 2026: $3,874');
});

it('keeps the tab order then, now, also where the needles have changed sides', () => {
  fixture.componentInstance.content.set(content('2021', '1938'));
  fixture.detectChanges();
  const labels = [...fixture.nativeElement.querySelectorAll('[role="slider"]')].map((element: Element) =>
    element.getAttribute('aria-label'),
  );
  expect(labels).toEqual(['Paid in', 'Restated to']);
  press('Restated to', 'End');
  expect(ends()).toEqual(['2021', '2021']);
});

describe('a pointer', () => {
  // 1296 px wide: the axis runs from 56 to 1252 over 113.5 years
  const xOf = (year: number) => 56 + (year + 0.5 - (1913 + 0.5 / 12)) * (1196 / 113.5);
  const point = (type: string, x: number, target: Element = fixture.nativeElement.querySelector('tw-year-scale')) => {
    target.dispatchEvent(
      Object.assign(new MouseEvent(type, { clientX: x, bubbles: true, button: 0 }), { pointerId: 1 }),
    );
    fixture.detectChanges();
  };

  beforeEach(() => {
    const host = fixture.nativeElement.querySelector('tw-year-scale') as HTMLElement;
    host.setPointerCapture = () => undefined;
    host.getBoundingClientRect = () => ({ left: 0, width: 1296 }) as DOMRect;
  });

  it('takes the nearer needle by its line and drags it from year to year', () => {
    point('pointerdown', xOf(1941) + 5);
    expect(document.activeElement).toBe(slider('Paid in'));
    point('pointermove', xOf(1955) + 5);
    expect(ends()).toEqual(['1955', '2026-07']);
    point('pointerup', xOf(1955));
    point('pointermove', xOf(1980));
    expect(ends()).toEqual(['1955', '2026-07']);
  });

  it('leaves the needles alone elsewhere', () => {
    point('pointerdown', xOf(1980));
    point('pointermove', xOf(1990));
    expect(ends()).toEqual(['1941', '2026-07']);
  });

  it('drags the now needle by its tag, no further than the then needle', () => {
    point('pointerdown', 1240, slider('Restated to'));
    point('pointermove', 1240 - 1252 + xOf(1920));
    expect(ends()).toEqual(['1941', '1941']);
  });
});
