import {
  ChangeDetectionStrategy,
  Component,
  effect,
  ElementRef,
  inject,
  input,
  output,
  viewChild,
} from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { isoDate, moneyAmount } from '../../../contracts/common';
import { recordWorth } from '../../../contracts/sets';
import {
  VALUE_TYPE_LABELS,
  VALUE_TYPES,
  WORTH_KIND_LABELS,
  WORTH_KINDS,
  type ValueType,
  type WorthKind,
} from '../../../domain/sets/terms';
import { fieldError, optionalZodField, zodField } from '../../core/form-problems';
import { SessionStore } from '../../core/session';
import { Notice } from '../../ui/notice';
import { Saving } from './saving';
import { SetStore } from './set-store';
import type { WorthBody } from './sets-api';
import { today } from './today';

const shape = recordWorth.body.shape;

/** Records what the set is worth: the amount and its range, who says so, as of when, and on what basis. */
@Component({
  selector: 'tw-worth-form',
  imports: [MatButton, MatFormFieldModule, MatInput, Notice, ReactiveFormsModule],
  templateUrl: './worth-form.html',
  styleUrl: './record-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WorthForm {
  readonly kind = input.required<WorthKind>();

  readonly recorded = output();
  readonly cancelled = output();

  private readonly store = inject(SetStore);
  private readonly amount = viewChild.required<ElementRef<HTMLInputElement>>('amount');

  protected readonly form = inject(NonNullableFormBuilder).group({
    kind: ['as-found' as WorthKind, zodField(shape.kind)],
    amount: ['', zodField(moneyAmount)],
    low: ['', optionalZodField(moneyAmount)],
    high: ['', optionalZodField(moneyAmount)],
    valueType: ['fair-market' as ValueType, zodField(shape.valueType)],
    effectiveOn: [today(), zodField(isoDate)],
    saidBy: [inject(SessionStore).user()?.name ?? '', zodField(shape.saidBy)],
    basis: ['', zodField(shape.basis)],
  });
  protected readonly controls = this.form.controls;
  protected readonly saving = new Saving(this.form);
  protected readonly fieldError = fieldError;
  protected readonly kinds = WORTH_KINDS.map((value) => ({ value, label: WORTH_KIND_LABELS[value] }));
  protected readonly valueTypes = VALUE_TYPES.map((value) => ({ value, label: VALUE_TYPE_LABELS[value] }));

  constructor() {
    effect(() => {
      this.controls.kind.setValue(this.kind());
      this.amount().nativeElement.focus();
    });
  }

  protected save(): void {
    const body = this.body();
    // What spans several fields, such as a low end above the amount, is the contract's to say.
    const parsed = recordWorth.body.safeParse(body);
    if (this.form.valid && !parsed.success)
      for (const { path, message } of parsed.error.issues) {
        const control = this.form.get(path.join('.'));
        control?.setErrors({ zod: message });
      }
    this.saving.run(
      () => this.store.recordWorth(body),
      () => this.recorded.emit(),
    );
  }

  private body(): WorthBody {
    const { low, high, ...same } = this.form.getRawValue();
    return { ...same, currency: 'USD', low: low === '' ? null : low, high: high === '' ? null : high };
  }
}
