import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute } from '@angular/router';
import { switchMap } from 'rxjs';
import { PaperFrame, type PaperState } from './paper-frame';
import { paperState } from './paper-state';
import { PapersApi } from './papers-api';

/** The appraisal sheet of the set in the address, with the estimate named there as `estimate`. */
@Component({
  selector: 'tw-appraisal-sheet-page',
  imports: [PaperFrame],
  template: '<tw-paper-frame [state]="state()" [files]="files()" [back]="back()" (retry)="again()" />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AppraisalSheetPage {
  private readonly api = inject(PapersApi);
  private readonly route = inject(ActivatedRoute);
  private readonly params = toSignal(this.route.paramMap, { requireSync: true });
  private readonly query = toSignal(this.route.queryParamMap, { requireSync: true });
  private readonly tries = signal(0);

  private readonly asked = computed(() => {
    const estimate = this.query().get('estimate');
    return {
      setId: Number(this.params().get('id')),
      ...(estimate === null ? {} : { estimateId: Number(estimate) }),
      tries: this.tries(),
    };
  });

  protected readonly state = toSignal(
    toObservable(this.asked).pipe(
      switchMap(({ setId, estimateId }) => paperState(this.api.appraisalSheet(setId, estimateId))),
    ),
    { initialValue: { status: 'loading' } satisfies PaperState },
  );
  protected readonly files = computed(() => this.api.appraisalSheetFiles(this.asked().setId, this.asked().estimateId));
  protected readonly back = computed(() => ({ link: `/sets/${this.asked().setId}`, text: 'Back to the set' }));

  protected again(): void {
    this.tries.update((count) => count + 1);
  }
}
