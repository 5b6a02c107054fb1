import { ChangeDetectionStrategy, Component, computed, inject, linkedSignal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { ActivatedRoute } from '@angular/router';
import { WORTH_KINDS, type WorthKind } from '../../../domain/sets/terms';
import { Empty } from '../../ui/empty';
import { SetStore } from './set-store';
import { WorthForm } from './worth-form';
import { WorthHistory } from './worth-history';

/** Every worth on record for a set, and recording one. The address may ask for the form: `?record=as-found`. */
@Component({
  selector: 'tw-set-worth',
  imports: [Empty, MatButton, WorthForm, WorthHistory],
  template: `
    @if (store.set(); as set) {
      @if (recording(); as kind) {
        <tw-worth-form [kind]="kind" (recorded)="recording.set(null)" (cancelled)="recording.set(null)" />
      } @else if (store.mayRecordWorth()) {
        <div class="tw-actions">
          <button matButton="filled" type="button" (click)="recording.set('as-found')">Record worth as found</button>
          <button matButton="outlined" type="button" (click)="recording.set('as-restored')">
            Record worth restored
          </button>
        </div>
      }
      @if (set.worths.length > 0) {
        <tw-worth-history [worths]="set.worths" [inForce]="inForce()" />
      } @else {
        <tw-empty
          title="No worth on record"
          text="What a set is worth is never worked out from its price when new. It needs somebody’s figure and its basis."
        />
      }
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 20px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetWorth {
  protected readonly store = inject(SetStore);
  private readonly query = toSignal(inject(ActivatedRoute).queryParamMap, { requireSync: true });

  protected readonly recording = linkedSignal<WorthKind | null>(() => {
    const asked = WORTH_KINDS.find((kind) => kind === this.query().get('record'));
    return this.store.mayRecordWorth() ? (asked ?? null) : null;
  });
  protected readonly inForce = computed(() =>
    [this.store.asFound(), this.store.asRestored()].flatMap((worth) => (worth ? [worth.id] : [])),
  );
}
