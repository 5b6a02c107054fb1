import { ChangeDetectionStrategy, Component, computed, effect, inject, input, output, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import * as z from 'zod';
import { amount } from '../../../contracts/common';
import type { SeriesSummary } from '../../../contracts/series';
import { formatPeriod, parsePeriod, type Period } from '../../../domain/calendar/period';
import { fieldError, zodField } from '../../core/form-problems';
import { inquiryKey, joinPeriod, splitPeriod, type Inquiry } from './inquiry';

const year = z.string().regex(/^\d{4}$/, 'Such as 1941.');

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'].map((name, i) => ({
  value: String(i + 1).padStart(2, '0'),
  name,
}));

/** A change of the inquiry, and which part of the page made it. */
export interface InquiryChange {
  readonly inquiry: Inquiry;
  readonly by: string;
}

/** The question: price, when it was paid, to which period's money, by which index. Presentational. */
@Component({
  selector: 'tw-restate-form',
  imports: [ReactiveFormsModule, MatFormFieldModule, MatInput, MatButton],
  templateUrl: './restate-form.html',
  styleUrl: './restate-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RestateForm {
  readonly inquiry = input.required<Inquiry>();
  readonly seriesList = input.required<readonly SeriesSummary[]>();

  readonly inquiryChange = output<InquiryChange>();

  private readonly fb = inject(NonNullableFormBuilder);
  protected readonly form = this.fb.group({
    amount: ['', zodField(amount)],
    fromYear: ['', zodField(year)],
    fromMonth: [''],
    toYear: ['', zodField(year)],
    toMonth: [''],
    series: [''],
  });
  protected readonly controls = this.form.controls;
  protected readonly months = MONTHS;
  protected readonly fieldError = fieldError;
  /** On phones the target and the index stay folded until asked for. */
  protected readonly unfolded = signal(false);

  protected readonly chosen = computed(() => this.seriesList().find(({ id }) => id === this.inquiry().series));
  protected readonly newest = computed(() => {
    const last = this.chosen()?.last;
    return last === undefined ? '' : formatPeriod(last as Period);
  });
  /** The newest published month, where the year it belongs to is the one asked for. */
  protected readonly newestMonth = computed(() => {
    const newest = splitPeriod(this.chosen()?.last ?? '');
    return newest.year === splitPeriod(this.inquiry().to ?? '').year ? newest.month : null;
  });
  protected readonly summary = computed(() => {
    const { to } = this.inquiry();
    return `To ${to && parsePeriod(to).ok ? formatPeriod(to as Period) : this.newest()}, by ${this.chosen()?.title ?? ''}.`;
  });

  /** The inquiry as this form last told it. */
  private told = '';

  constructor() {
    effect(() => {
      const inquiry = this.inquiry();
      // What is being typed stays as typed; only a change from elsewhere is written over it.
      if (inquiryKey(inquiry) === this.told) return;
      this.form.setValue(toForm(inquiry), { emitEvent: false });
    });
    for (const [name, control] of Object.entries(this.controls)) {
      control.valueChanges.pipe(takeUntilDestroyed()).subscribe(() => {
        // The group has the value only after its controls have told it.
        queueMicrotask(() => this.tell(name));
      });
    }
  }

  private tell(by: string): void {
    const inquiry = fromForm(this.form.getRawValue());
    this.told = inquiryKey(inquiry);
    this.inquiryChange.emit({ inquiry, by });
  }

  protected toNewest(): void {
    const last = this.chosen()?.last;
    if (last !== undefined) this.inquiryChange.emit({ inquiry: { ...this.inquiry(), to: last }, by: 'newest' });
  }
}

interface FormValue {
  amount: string;
  fromYear: string;
  fromMonth: string;
  toYear: string;
  toMonth: string;
  series: string;
}

function toForm({ amount, from, to, series }: Inquiry): FormValue {
  const [paid, target] = [splitPeriod(from), splitPeriod(to ?? '')];
  return { amount, fromYear: paid.year, fromMonth: paid.month, toYear: target.year, toMonth: target.month, series };
}

const fromForm = (value: FormValue): Inquiry => ({
  amount: value.amount.trim(),
  from: joinPeriod(value.fromYear.trim(), value.fromMonth),
  to: joinPeriod(value.toYear.trim(), value.toMonth),
  series: value.series,
});
