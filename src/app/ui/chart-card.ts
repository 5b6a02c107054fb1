import { ChangeDetectionStrategy, Component, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';

let cards = 0;

/**
 * A chart with its table twin: project the drawing with the attribute `chart`, the table with `table`, further
 * switches with `actions`, a verdict under both with none of these. The sentence says what the chart shows.
 */
@Component({
  selector: 'tw-chart-card',
  imports: [MatButton],
  templateUrl: './chart-card.html',
  styleUrl: './chart-card.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChartCard {
  // Not `title`: the host would show it as a tooltip.
  readonly heading = input.required<string>();
  readonly sentence = input.required<string>();
  /** A line under the chart: basis, gaps, what the axis is. */
  readonly note = input('');

  protected readonly asTable = signal(false);
  protected readonly headingId = `tw-chart-card-${++cards}`;
}
