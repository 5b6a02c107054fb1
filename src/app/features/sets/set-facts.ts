import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { SetDetail } from '../../../contracts/sets';
import { SET_KIND_LABELS } from '../../../domain/sets/terms';
import { KindDrawing } from '../../ui/kind-drawing';

/** The picture that stands for a set, and its identity. Presentational. */
@Component({
  selector: 'tw-set-facts',
  imports: [KindDrawing, RouterLink],
  template: `
    <div class="tw-panel">
      @if (first(); as photo) {
        <a [routerLink]="['/sets', set().id, 'photos']" [queryParams]="{ photo: photo.id }">
          <img
            [src]="photo.large"
            [attr.width]="photo.width"
            [attr.height]="photo.height"
            [alt]="photo.caption || set().maker + ' ' + set().model"
          />
        </a>
      } @else {
        <tw-kind-drawing [kind]="set().kind" />
      }
      <dl>
        @for (fact of facts(); track fact.label) {
          <div>
            <dt>{{ fact.label }}</dt>
            <dd>{{ fact.text }}</dd>
          </div>
        }
      </dl>
    </div>
  `,
  styles: `
    :host {
      display: block;
    }
    .tw-panel {
      padding: 16px;
    }
    img {
      display: block;
      width: 100%;
      height: auto;
      max-height: 360px;
      object-fit: contain;
      border-radius: var(--tw-corner-control);
    }
    tw-kind-drawing {
      max-width: 200px;
      margin: 0 auto;
    }
    dl {
      margin: 12px 0 0;
    }
    dl div {
      display: flex;
      gap: 16px;
      justify-content: space-between;
      padding: 3px 0;
    }
    dt {
      color: var(--mat-sys-on-surface-variant);
    }
    dd {
      margin: 0;
      text-align: right;
      overflow-wrap: anywhere;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetFacts {
  readonly set = input.required<SetDetail>();

  protected readonly first = computed(() => this.set().photos[0]);
  protected readonly facts = computed(() => {
    const set = this.set();
    return [
      { label: 'Kind', text: SET_KIND_LABELS[set.kind] },
      { label: 'Maker', text: set.maker },
      { label: 'Model', text: set.model },
      { label: 'Year', text: set.year === null ? 'Not known' : String(set.year) },
      { label: 'Chassis', text: set.chassis },
      { label: 'Serial', text: set.serial },
      { label: 'Price source', text: set.priceWhenNew?.source ?? '' },
      { label: 'On Then and now', text: set.priceIsPublic && set.priceWhenNew ? 'Shown' : '' },
    ].filter(({ text }) => text !== '');
  });
}
