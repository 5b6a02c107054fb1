import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute } from '@angular/router';
import { switchMap } from 'rxjs';
import { PaperFrame, type PaperState } from './paper-frame';
import { paperState } from './paper-state';
import { PapersApi } from './papers-api';

/** The restoration estimate in the address. */
@Component({
  selector: 'tw-restoration-estimate-page',
  imports: [PaperFrame],
  template: '<tw-paper-frame [state]="state()" [files]="files()" [back]="back()" (retry)="again()" />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RestorationEstimatePage {
  private readonly api = inject(PapersApi);
  private readonly params = toSignal(inject(ActivatedRoute).paramMap, { requireSync: true });
  private readonly tries = signal(0);

  private readonly asked = computed(() => ({ id: Number(this.params().get('id')), tries: this.tries() }));

  protected readonly state = toSignal(
    toObservable(this.asked).pipe(switchMap(({ id }) => paperState(this.api.restorationEstimate(id)))),
    { initialValue: { status: 'loading' } satisfies PaperState },
  );
  protected readonly files = computed(() => this.api.restorationEstimateFiles(this.asked().id));
  protected readonly back = computed(() => ({ link: `/estimates/${this.asked().id}`, text: 'Back to the estimate' }));

  protected again(): void {
    this.tries.update((count) => count + 1);
  }
}
