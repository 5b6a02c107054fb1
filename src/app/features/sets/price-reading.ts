import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { RestatedPrice } from '../../../contracts/sets';
import { bandSentences, exactText } from './restated-words';

/** How to read the year scale of a set: the sum, both bands, and that none of it is worth. Presentational. */
@Component({
  selector: 'tw-price-reading',
  template: `
    @let price = restated();
    @if (price.known) {
      <p>
        <strong>What it cost then. What that is in money now.</strong>
        To the cent {{ exact() }}. {{ bands() }} It is not what the set is worth.
      </p>
      <p class="tw-basis">{{ price.basis }}</p>
    } @else {
      <p>
        <strong>What that is in money now is not known.</strong>
        {{ price.reason }}
      </p>
      <p class="tw-basis">Nothing is interpolated.</p>
    }
  `,
  styles: `
    :host {
      display: block;
    }
    p {
      margin: 4px 0 0;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PriceReading {
  readonly restated = input.required<RestatedPrice>();

  protected readonly exact = computed(() => {
    const price = this.restated();
    return price.known ? exactText(price) : '';
  });
  protected readonly bands = computed(() => {
    const price = this.restated();
    return price.known ? bandSentences(price).join(' ') : '';
  });
}
