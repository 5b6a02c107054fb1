import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { SetSummary } from '../../../contracts/sets';
import { SetThumbnail } from './set-thumbnail';
import { priceText, wholeText } from './set-words';

/** Sets as cards, for windows under 840 px. Presentational. */
@Component({
  selector: 'tw-sets-cards',
  imports: [RouterLink, SetThumbnail],
  template: `
    <ul class="cards">
      @for (set of sets(); track set.id) {
        <li class="tw-panel card">
          <tw-set-thumbnail [kind]="set.kind" [photo]="set.photo" />
          <div class="name">
            <a [routerLink]="['/sets', set.id]">{{ set.maker }} {{ set.model }}</a>
            <p>
              {{ set.number }}{{ set.year ? ', ' + set.year : '' }}{{ set.ownerName ? ', ' + set.ownerName : ''
              }}{{ set.archived ? ', archived' : '' }}
            </p>
          </div>
          <dl>
            <div>
              <dt>Cost when new</dt>
              <dd>{{ priceText(set.priceWhenNew) }}</dd>
            </div>
            <div>
              <dt>Today’s money</dt>
              <dd>{{ wholeText(set.restated) }}</dd>
            </div>
            <div>
              <dt>As found</dt>
              <dd>{{ wholeText(set.worthAsFound) }}</dd>
            </div>
            <div>
              <dt>Restored</dt>
              <dd [class.strong]="set.worthRestored !== null">{{ wholeText(set.worthRestored) }}</dd>
            </div>
          </dl>
        </li>
      }
    </ul>
  `,
  styleUrl: './sets-cards.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetsCards {
  readonly sets = input.required<readonly SetSummary[]>();

  protected readonly priceText = priceText;
  protected readonly wholeText = wholeText;
}
