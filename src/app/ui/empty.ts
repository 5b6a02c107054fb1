import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { BareScale } from './bare-scale';

/** Nothing here yet: the bare scale, one sentence, and the next step as content. */
@Component({
  selector: 'tw-empty',
  imports: [BareScale],
  template: `
    <tw-bare-scale />
    <h2>{{ title() }}</h2>
    <p>{{ text() }}</p>
    <ng-content />
  `,
  styleUrl: './state.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Empty {
  readonly title = input.required<string>();
  readonly text = input('');
}
