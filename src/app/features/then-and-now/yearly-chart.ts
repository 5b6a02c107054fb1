import { ChangeDetectionStrategy, Component, computed, inject, input, signal, type Signal } from '@angular/core';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import type { ChartConfiguration } from 'chart.js';
import { BaseChartDirective } from 'ng2-charts';
import { formatPeriod } from '../../../domain/calendar/period';
import { formatMoney } from '../../../domain/money/money';
import type { IndexSeries } from '../../../domain/series/series';
import { ChartCard } from '../../ui/chart-card';
import { ChartTheme } from '../../ui/chart-theme';
import { formatFigure, formatPrice, type ShownRestatement } from './shown-restatement';
import { amountsByMonth, amountsByYear, bridges, type ChartedAmount } from './yearly-amounts';

/** The price restated to every published year, or to each month of the last ten years, as chart and as table. */
@Component({
  selector: 'tw-yearly-chart',
  imports: [BaseChartDirective, ChartCard, MatButtonToggleModule],
  templateUrl: './yearly-chart.html',
  styleUrl: './yearly-chart.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class YearlyChart {
  readonly shown = input.required<ShownRestatement>();
  readonly series = input.required<IndexSeries>();

  private readonly theme = inject(ChartTheme);
  protected readonly by = signal<'year' | 'month'>('year');

  protected readonly amounts = computed(() => {
    const { original, from } = this.shown();
    const charted = { series: this.series(), amount: original, from: from.period };
    return this.by() === 'year' ? amountsByYear(charted) : amountsByMonth(charted);
  });

  protected readonly rows = computed(() =>
    [...this.amounts()].reverse().map(({ period, amount }) => ({
      period: formatPeriod(period),
      amount: amount === null ? 'Never published' : formatMoney(amount, this.shown().currency),
    })),
  );

  protected readonly sentence = computed(() => {
    const shown = this.shown();
    const published = this.amounts().filter((entry) => entry.amount !== null);
    const [first, last] = [published.at(0), published.at(-1)];
    if (!first?.amount || !last?.amount) return 'There is nothing to chart.';
    return (
      `${formatPrice(shown.original, shown.currency)} paid in ${formatPeriod(shown.from.period)} comes to ` +
      `${formatFigure(shown, first.amount)} in ${formatPeriod(first.period)} and ` +
      `${formatFigure(shown, last.amount)} in ${formatPeriod(last.period)}.`
    );
  });

  protected readonly note = computed(() => {
    const missing = this.amounts().filter((entry) => entry.amount === null);
    const gaps = missing.length
      ? ` Never published: ${missing.map(({ period }) => formatPeriod(period)).join(', ')}; the dots bridge the gap and claim nothing.`
      : '';
    const points = this.by() === 'year' ? 'Published annual averages' : 'Published months';
    return `${points}, release ${this.shown().release}.${gaps}`;
  });

  protected readonly data = computed<ChartConfiguration<'line'>['data']>(() => {
    const colours = this.theme.colours();
    const points = this.amounts().map(point);
    const line = { borderColor: colours.line, borderWidth: 2, pointRadius: 0, pointHitRadius: 8 };
    return {
      datasets: [
        { ...line, label: 'Restated', data: points, backgroundColor: colours.shade, fill: 'origin', spanGaps: false },
        ...bridges(this.amounts()).map((ends) => ({
          ...line,
          label: 'Gap',
          data: ends.map(point),
          borderDash: [2, 4],
          pointHitRadius: 0,
        })),
      ],
    };
  });

  protected readonly options: Signal<ChartConfiguration<'line'>['options']> = computed(() => {
    const colours = this.theme.colours();
    const { currency } = this.shown();
    const amounts = this.amounts();
    const whole = (value: number) => formatMoney(String(value), currency, { whole: Number.isInteger(value) });
    return {
      responsive: true,
      maintainAspectRatio: false,
      animation: false,
      interaction: { mode: 'nearest', axis: 'x', intersect: false },
      plugins: {
        tooltip: {
          backgroundColor: colours.ink,
          titleColor: colours.ground,
          bodyColor: colours.ground,
          displayColors: false,
          filter: (item) => item.datasetIndex === 0,
          callbacks: {
            title: (items) =>
              items.map((item) => (amounts[item.dataIndex] ? formatPeriod(amounts[item.dataIndex]!.period) : '')),
            label: (item) => formatMoney(amounts[item.dataIndex]?.amount ?? '0', currency),
          },
        },
      },
      scales: {
        x: {
          type: 'linear',
          min: amounts.at(0)?.time ?? 0,
          max: amounts.at(-1)?.time ?? 1,
          grid: { display: false },
          border: { color: colours.soft },
          ticks: {
            color: colours.soft,
            maxRotation: 0,
            maxTicksLimit: 12,
            includeBounds: false,
            precision: 0,
            callback: (value) => (Number.isInteger(Number(value)) ? String(value) : ''),
          },
        },
        y: {
          beginAtZero: this.by() === 'year',
          border: { display: false },
          grid: { color: colours.grid },
          ticks: { color: colours.soft, maxTicksLimit: 6, callback: (value) => whole(Number(value)) },
        },
      },
    };
  });
}

const point = ({ time, amount }: ChartedAmount) => ({ x: time, y: amount === null ? Number.NaN : Number(amount) });
