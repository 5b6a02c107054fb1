import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { RestatedPrice } from '../../../contracts/sets';
import { formatPeriod, parsePeriod } from '../../../domain/calendar/period';
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
      @if (neighbours()) {
        <p class="tw-basis">Nearest published periods: {{ neighbours() }}. Nothing is interpolated.</p>
      }
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
  protected readonly neighbours = computed(() => {
    const price = this.restated();
    if (price.known) return '';
    return price.neighbours
      .map((text) => {
        const parsed = parsePeriod(text);
        return parsed.ok ? formatPeriod(parsed.value) : text;
      })
      .join(' and ');
  });
}
