import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  output,
  signal,
  untracked,
} from '@angular/core';
import { FormControl, NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatAutocompleteModule, type MatAutocompleteSelectedEvent } from '@angular/material/autocomplete';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { addOwner, type Owner } from '../../../contracts/owners';
import { fieldError, zodField } from '../../core/form-problems';

export interface NewOwner {
  readonly name: string;
  readonly email: string;
  readonly phone: string;
}

const ownerSchema = addOwner.body.shape;

/** Chooses an owner by name, or asks for a new one to be put on record. Presentational. */
@Component({
  selector: 'tw-owner-field',
  imports: [MatAutocompleteModule, MatButton, MatFormFieldModule, MatInput, ReactiveFormsModule],
  templateUrl: './owner-field.html',
  styleUrl: './owner-field.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OwnerField {
  readonly owners = input.required<readonly Owner[]>();
  readonly control = input.required<FormControl<number | null>>();
  /** Why the new owner was not added. */
  readonly trouble = input('');

  readonly add = output<NewOwner>();

  private readonly fb = inject(NonNullableFormBuilder);
  protected readonly text = this.fb.control('');
  /** As typed by hand; the field itself also takes the value of a chosen option. */
  private readonly typed = signal('');
  protected readonly adding = signal(false);
  protected readonly fieldError = fieldError;
  protected readonly fresh = this.fb.group({
    name: ['', zodField(ownerSchema.name)],
    email: ['', zodField(ownerSchema.email)],
    phone: ['', zodField(ownerSchema.phone)],
  });

  protected readonly matches = computed(() => {
    const words = this.typed().trim().toLowerCase();
    return this.owners().filter(({ name, email }) => `${name} ${email}`.toLowerCase().includes(words));
  });

  constructor() {
    effect((onCleanup) => {
      const control = this.control();
      // Names the owner once the list has come, unless somebody types already.
      if (this.chosenName() !== '' && untracked(this.typed) === '') this.showChosen();
      const watch = control.valueChanges.subscribe(() => this.showChosen());
      onCleanup(() => watch.unsubscribe());
    });
  }

  protected type(event: Event): void {
    this.typed.set((event.target as HTMLInputElement).value);
  }

  protected choose({ option }: MatAutocompleteSelectedEvent): void {
    const value = option.value as Owner | 'new';
    if (value === 'new') this.startAdding();
    else this.set(value.id);
  }

  /** Text that names nobody is not an owner: an empty field clears, a name in full chooses, the rest is refused. */
  protected settle(): void {
    const text = this.text.value.trim().toLowerCase();
    if (this.adding()) return;
    const named = this.owners().filter(({ name }) => name.toLowerCase() === text);
    const [only] = named;
    if (text === '') this.set(null);
    else if (this.chosenName().toLowerCase() === text) this.refuse(false);
    else if (only !== undefined && named.length === 1) this.set(only.id);
    else this.refuse(true);
  }

  protected startAdding(): void {
    this.refuse(false);
    this.text.setValue(this.typed());
    this.fresh.reset({ name: this.typed().trim() });
    this.adding.set(true);
  }

  protected stopAdding(): void {
    this.adding.set(false);
    this.showChosen();
  }

  protected submit(): void {
    if (this.fresh.invalid) this.fresh.markAllAsTouched();
    else this.add.emit(this.fresh.getRawValue());
  }

  added(): void {
    this.adding.set(false);
    this.showChosen();
  }

  private set(id: number | null): void {
    const control = this.control();
    if (control.value !== id) {
      control.setValue(id);
      control.markAsDirty();
    }
    this.refuse(false);
    this.showChosen();
  }

  private refuse(refused: boolean): void {
    const errors = refused ? { zod: 'Choose an owner from the list, or add a new one.' } : null;
    this.text.setErrors(errors);
    this.control().setErrors(errors);
  }

  private chosenName(): string {
    return this.owners().find(({ id }) => id === this.control().value)?.name ?? '';
  }

  private showChosen(): void {
    this.typed.set('');
    this.text.setValue(this.chosenName());
    // What the server says against the owner is said at the field.
    this.text.setErrors(this.control().errors);
  }
}
