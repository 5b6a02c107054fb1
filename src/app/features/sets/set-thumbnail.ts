import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { SetKind } from '../../../domain/sets/terms';
import { KindDrawing } from '../../ui/kind-drawing';

/** The first photograph of a set, or a line drawing of its kind. Decorative: the name stands beside it. */
@Component({
  selector: 'tw-set-thumbnail',
  imports: [KindDrawing],
  template: `
    @if (photo(); as address) {
      <img alt="" width="44" height="44" loading="lazy" [src]="address" />
    } @else {
      <tw-kind-drawing [kind]="kind()" />
    }
  `,
  styles: `
    :host {
      display: grid;
      flex: none;
      place-items: center;
      width: 44px;
      height: 44px;
      overflow: hidden;
      background: var(--mat-sys-surface-container);
      border-radius: var(--tw-corner-control);
    }
    img {
      width: 44px;
      height: 44px;
      object-fit: cover;
    }
    tw-kind-drawing {
      width: 36px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetThumbnail {
  readonly kind = input.required<SetKind>();
  readonly photo = input.required<string | null>();
}
