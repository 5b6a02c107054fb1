import {
  ChangeDetectionStrategy,
  Component,
  inject,
  input,
  linkedSignal,
  output,
  signal,
  type OnInit,
} from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatHint, MatLabel, MatSuffix } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatOption, MatSelect } from '@angular/material/select';
import { estimateDetail, updateEstimate, type EstimateDetail } from '../../../contracts/estimates';
import { TAX_TREATMENT_LABELS, TAX_TREATMENTS } from '../../../domain/estimate/terms';
import { ApiProblem } from '../../core/api-client';
import { fieldError, showProblem, zodField } from '../../core/form-problems';
import { Notice } from '../../ui/notice';
import { EstimatesApi } from './estimates-api';

const fields = updateEstimate.body.shape;

/** Title, tax, deposit and notes of an estimate. */
@Component({
  selector: 'tw-estimate-settings',
  imports: [
    MatButton,
    MatError,
    MatFormField,
    MatHint,
    MatInput,
    MatLabel,
    MatOption,
    MatSelect,
    MatSuffix,
    Notice,
    ReactiveFormsModule,
  ],
  templateUrl: './estimate-settings.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EstimateSettings implements OnInit {
  readonly estimate = input.required<EstimateDetail>();
  readonly saved = output<EstimateDetail>();
  readonly closed = output();

  private readonly api = inject(EstimatesApi);
  private readonly builder = inject(NonNullableFormBuilder);
  protected readonly treatments = TAX_TREATMENTS;
  protected readonly treatmentLabels = TAX_TREATMENT_LABELS;
  protected readonly fieldError = fieldError;
  protected readonly saving = signal(false);
  protected readonly trouble = signal('');
  /** Set when somebody else saved meanwhile: what stands now. */
  protected readonly theirs = signal<EstimateDetail | null>(null);
  private readonly version = linkedSignal(() => this.estimate().version);

  protected readonly form = this.builder.group({
    title: ['', zodField(fields.title)],
    taxTreatment: this.builder.control<EstimateDetail['taxTreatment']>('none'),
    taxRatePercent: ['', zodField(fields.taxRatePercent)],
    taxNote: ['', zodField(fields.taxNote)],
    depositPercent: ['', zodField(fields.depositPercent)],
    notes: ['', zodField(fields.notes)],
  });

  ngOnInit(): void {
    this.fill(this.estimate());
  }

  /** Whether something is typed that is not saved. */
  get dirty(): boolean {
    return this.form.dirty;
  }

  private fill({ title, taxTreatment, taxRatePercent, taxNote, depositPercent, notes }: EstimateDetail): void {
    this.form.reset({ title, taxTreatment, taxRatePercent, taxNote, depositPercent, notes });
  }

  protected submit(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.saving()) return;
    this.saving.set(true);
    this.trouble.set('');
    this.api.update(this.estimate().id, { ...this.form.getRawValue(), version: this.version() }).subscribe({
      next: (estimate) => {
        this.saving.set(false);
        this.fill(estimate);
        this.saved.emit(estimate);
      },
      error: (error: unknown) => {
        this.saving.set(false);
        if (!(error instanceof ApiProblem)) throw error;
        const current = error.code === 'edit-conflict' ? estimateDetail.safeParse(error.problem.current) : undefined;
        if (current?.success === true) this.theirs.set(current.data);
        else this.trouble.set(showProblem(this.form, error));
      },
    });
  }

  protected takeTheirs(theirs: EstimateDetail): void {
    this.theirs.set(null);
    this.fill(theirs);
    this.saved.emit(theirs);
  }

  protected keepMine(theirs: EstimateDetail): void {
    this.theirs.set(null);
    this.version.set(theirs.version);
    this.submit();
  }
}
