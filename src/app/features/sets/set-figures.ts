import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { SetDetail, Worth } from '../../../contracts/sets';
import { formatPeriod, type Period } from '../../../domain/calendar/period';
import { Figure } from '../../ui/figure';
import { aboutText, bandText, releaseText } from './restated-words';
import { NOT_KNOWN, priceText, rangeText, wholeText, worthBasis } from './set-words';

/** The four figures of a set: cost when new, that in today's money, worth as found, worth restored. Presentational. */
@Component({
  selector: 'tw-set-figures',
  imports: [Figure, RouterLink],
  templateUrl: './set-figures.html',
  styles: `
    :host {
      display: block;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetFigures {
  readonly set = input.required<SetDetail>();
  readonly asFound = input.required<Worth | undefined>();
  readonly asRestored = input.required<Worth | undefined>();
  readonly mayEdit = input(false);
  readonly mayRecordWorth = input(false);

  protected readonly notKnown = NOT_KNOWN;
  protected readonly price = computed(() => {
    const price = this.set().priceWhenNew;
    return price && { text: priceText(price), when: formatPeriod(price.period), source: price.source };
  });
  protected readonly restated = computed(() => {
    const restated = this.set().restated;
    if (!restated?.known) return null;
    return {
      about: aboutText(restated),
      band: bandText(restated, restated.rounding),
      basis: `${releaseText(restated)}, to ${formatPeriod(restated.to.period as Period)}`,
    };
  });
  protected readonly notRestated = computed(() => {
    const restated = this.set().restated;
    if (restated === null) return { words: NOT_KNOWN, basis: 'Needs the price when new and its date' };
    if (restated.known) return null;
    return { words: 'Cannot be restated', basis: restated.reason };
  });
  protected readonly worths = computed(() => [
    { kind: 'as-found', label: 'Worth as found', shown: shownWorth(this.asFound()) },
    { kind: 'as-restored', label: 'Worth restored', shown: shownWorth(this.asRestored()) },
  ]);
}

const shownWorth = (worth: Worth | undefined) =>
  worth === undefined
    ? null
    : { amount: wholeText(worth.amount), range: rangeText(worth), basis: `${worthBasis(worth)}. ${worth.basis}` };
