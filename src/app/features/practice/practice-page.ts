import { ChangeDetectionStrategy, Component, computed, effect, inject, signal } from '@angular/core';
import { rxResource, toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule, type AbstractControl } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatHint, MatLabel, MatPrefix, MatSuffix } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatOption, MatSelect } from '@angular/material/select';
import { MatSnackBar } from '@angular/material/snack-bar';
import { practice as practiceSchema, updatePractice, type Practice } from '../../../contracts/practice';
import {
  PAPER_SIZES,
  TAX_TREATMENT_LABELS,
  TAX_TREATMENTS,
  type PaperSize,
  type TaxTreatment,
} from '../../../domain/estimate/terms';
import type { ApiProblem } from '../../core/api-client';
import { fieldError, zodField } from '../../core/form-problems';
import { FormSubmission } from '../../core/form-submission';
import type { HoldsUnsaved } from '../../core/unsaved';
import { Failed } from '../../ui/failed';
import { Notice } from '../../ui/notice';
import { Sweep } from '../../ui/sweep';
import { PracticeApi } from './practice-api';
import { mergeSettings, PAPER_LABELS, sameSettings, settingsOf, type SettingName, type Settings } from './settings';
import { SettingsConflict } from './settings-conflict';
import { depositFigure, markupFigure, taxFigure } from './worked-figures';

const { shape } = updatePractice.body;

/** The practice's name, rates, taxes and deposit; new estimates begin with them. */
@Component({
  selector: 'tw-practice-page',
  imports: [
    Failed,
    MatButton,
    MatError,
    MatFormField,
    MatHint,
    MatInput,
    MatLabel,
    MatOption,
    MatPrefix,
    MatSelect,
    MatSuffix,
    Notice,
    ReactiveFormsModule,
    SettingsConflict,
    Sweep,
  ],
  templateUrl: './practice-page.html',
  styleUrl: './practice-page.scss',
  host: { '(window:beforeunload)': 'warnUnsaved($event)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PracticePage implements HoldsUnsaved {
  private readonly api = inject(PracticeApi);
  private readonly snackBar = inject(MatSnackBar);

  protected readonly practice = rxResource({ stream: () => this.api.get() });
  /** What was last loaded or saved: whatever differs from it is unsaved. */
  private base: Practice | null = null;
  /** The settings that somebody else changed meanwhile to something else than here. */
  protected readonly conflict = signal<{ theirs: Settings; differing: readonly SettingName[] } | null>(null);

  private readonly fields = inject(NonNullableFormBuilder);
  protected readonly form = this.fields.group({
    name: ['', zodField(shape.name)],
    address: ['', zodField(shape.address)],
    phone: ['', zodField(shape.phone)],
    email: ['', zodField(shape.email)],
    labourRate: ['', zodField(shape.labourRate)],
    partsMarkupPercent: ['', zodField(shape.partsMarkupPercent)],
    outsideMarkupPercent: ['', zodField(shape.outsideMarkupPercent)],
    taxTreatment: this.fields.control<TaxTreatment>('none'),
    taxRatePercent: ['', zodField(shape.taxRatePercent)],
    taxNote: ['', zodField(shape.taxNote)],
    depositPercent: ['', zodField(shape.depositPercent)],
    paperSize: this.fields.control<PaperSize>('letter'),
  });
  protected readonly submission = new FormSubmission(this.form);
  protected readonly fieldError = fieldError;
  protected readonly taxHint =
    'States differ on whether repair labour is taxed. Ask the tax authority of yours, or whoever does your taxes.';
  protected readonly treatments = TAX_TREATMENTS.map((value) => ({ value, label: TAX_TREATMENT_LABELS[value] }));
  protected readonly papers = PAPER_SIZES.map((value) => ({ value, label: PAPER_LABELS[value] }));

  private readonly changed = toSignal(this.form.events);
  /** The settings worked out on a small example; empty while what is typed cannot be used. */
  protected readonly worked = computed(() => {
    this.changed();
    const { partsMarkupPercent, outsideMarkupPercent, taxTreatment, taxRatePercent, depositPercent } =
      this.form.controls;
    return {
      parts: whenValid(partsMarkupPercent, markupFigure),
      outside: whenValid(outsideMarkupPercent, markupFigure),
      tax: whenValid(taxRatePercent, (rate) => taxFigure(taxTreatment.value, rate)),
      deposit: whenValid(depositPercent, depositFigure),
    };
  });

  constructor() {
    effect(() => {
      if (this.practice.hasValue() && this.base === null) this.show(this.practice.value());
    });
  }

  hasUnsaved(): boolean {
    return this.base !== null && !sameSettings(this.form.getRawValue(), settingsOf(this.base));
  }

  protected warnUnsaved(event: BeforeUnloadEvent): void {
    if (this.hasUnsaved()) event.preventDefault();
  }

  protected save(): void {
    const { base } = this;
    if (base === null) return;
    this.submission.send(
      () => this.api.update({ ...base, ...this.form.getRawValue() }),
      (saved) => {
        this.show(saved);
        this.snackBar.open('The settings are saved. New estimates begin with them.', 'Close', { duration: 6000 });
      },
      (problem) => this.takeConflict(problem),
    );
  }

  protected takeTheirs(name: SettingName): void {
    const { theirs, differing } = this.conflict() ?? {};
    if (theirs === undefined || differing === undefined) return;
    this.form.patchValue({ [name]: theirs[name] });
    this.conflict.set({ theirs, differing: differing.filter((other) => other !== name) });
  }

  private show(practice: Practice): void {
    this.base = practice;
    this.form.reset(settingsOf(practice));
    this.conflict.set(null);
  }

  /** Somebody else saved first. What was typed here stays; saving again goes over theirs, knowingly. */
  private takeConflict({ code, problem }: ApiProblem): boolean {
    const current = practiceSchema.safeParse(problem.current);
    if (code !== 'edit-conflict' || !current.success || this.base === null) return false;
    const theirs = settingsOf(current.data);
    const { merged, differing } = mergeSettings(settingsOf(this.base), this.form.getRawValue(), theirs);
    this.base = current.data;
    this.form.setValue(merged);
    this.conflict.set({ theirs, differing });
    return true;
  }
}

const whenValid = (control: AbstractControl<string>, figure: (text: string) => string): string =>
  control.valid && control.value !== '' ? figure(control.value) : '';
