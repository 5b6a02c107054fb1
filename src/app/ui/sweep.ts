import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { BareScale } from './bare-scale';

/** Waiting: the needle sweeps, shown only when it takes longer than 300 ms. */
@Component({
  selector: 'tw-sweep',
  imports: [BareScale],
  template: `
    <tw-bare-scale state="sweep" />
    <p>{{ label() }} …</p>
  `,
  styleUrl: './state.scss',
  host: { role: 'status', class: 'late' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Sweep {
  readonly label = input('Loading');
}
