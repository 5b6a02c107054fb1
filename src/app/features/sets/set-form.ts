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
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatCheckbox } from '@angular/material/checkbox';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { RouterLink } from '@angular/router';
import type { Owner } from '../../../contracts/owners';
import { SET_KIND_LABELS, SET_KINDS } from '../../../domain/sets/terms';
import { fieldError } from '../../core/form-problems';
import { Notice } from '../../ui/notice';
import { HazardsField } from './hazards-field';
import { OwnerField, type NewOwner } from './owner-field';
import { checkTogether, type SetForm } from './set-form-model';

/** The form of a set's record. Presentational: what is typed lives in `form`, saving is the page's. */
@Component({
  selector: 'tw-set-form',
  imports: [
    HazardsField,
    MatButton,
    MatCheckbox,
    MatFormFieldModule,
    MatInput,
    Notice,
    OwnerField,
    ReactiveFormsModule,
    RouterLink,
  ],
  templateUrl: './set-form.html',
  styleUrl: './set-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetFormView {
  readonly form = input.required<SetForm>();
  readonly owners = input.required<readonly Owner[]>();
  readonly ownerTrouble = input('');
  /** What the price comes to in today's money, in words. */
  readonly preview = input('');
  /** Why the form was not saved. */
  readonly trouble = input('');
  readonly saving = input(false);
  /** Saving waits for a decision elsewhere on the page. */
  readonly blocked = input(false);
  readonly action = input.required<string>();
  readonly back = input.required<string>();

  readonly save = output();
  readonly addOwner = output<NewOwner>();

  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  private readonly ownerField = viewChild.required(OwnerField);

  protected readonly fieldError = fieldError;
  protected readonly kinds = SET_KINDS.map((value) => ({ value, label: SET_KIND_LABELS[value] }));

  constructor() {
    effect((onCleanup) => {
      const form = this.form();
      const watch = form.controls.priceWhenNew.valueChanges.subscribe(() => checkTogether(form));
      onCleanup(() => watch.unsubscribe());
    });
  }

  /** Brings the first field that cannot be saved into view, with the keyboard in it. */
  showFirstError(): void {
    queueMicrotask(() =>
      this.host.nativeElement
        .querySelector<HTMLElement>('input.ng-invalid, select.ng-invalid, textarea.ng-invalid')
        ?.focus(),
    );
  }

  /** The owner asked for is on record and chosen. */
  ownerAdded(): void {
    this.ownerField().added();
  }
}
