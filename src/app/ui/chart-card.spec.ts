import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { ChartCard } from './chart-card';

@Component({
  imports: [ChartCard],
  template: `<tw-chart-card heading="Year by year" sentence="Prices rose." note="Published averages.">
    <div chart class="drawn"></div>
    <table table></table>
  </tw-chart-card>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {}

it('shows the chart with its sentence, and on request the table in its place', () => {
  const fixture = TestBed.createComponent(Host);
  fixture.detectChanges();
  const card = fixture.nativeElement as HTMLElement;
  const chart = card.querySelector<HTMLElement>('[role="img"]')!;
  const table = card.querySelector<HTMLElement>('[role="region"]')!;
  const button = card.querySelector('button')!;
  expect(chart.getAttribute('aria-label')).toBe('Prices rose.');
  expect(chart.querySelector('.drawn')).not.toBeNull();
  expect([chart.hidden, table.hidden]).toEqual([false, true]);

  expect(button.textContent?.trim()).toBe('Show as table');
  button.click();
  fixture.detectChanges();
  expect([chart.hidden, table.hidden]).toEqual([true, false]);
  expect(table.querySelector('table')).not.toBeNull();

  expect(button.textContent?.trim()).toBe('Show as chart');
  button.click();
  fixture.detectChanges();
  expect([chart.hidden, table.hidden]).toEqual([false, true]);
});
