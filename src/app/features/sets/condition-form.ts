import { ChangeDetectionStrategy, Component, computed, effect, inject, input, output, signal } from '@angular/core';
import { FormControl, FormGroup, NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { isoDate } from '../../../contracts/common';
import { recordCondition } from '../../../contracts/sets';
import { GRADE_LABELS, GRADES, SET_PART_LABELS, SET_PARTS, type Grade, type SetPart } from '../../../domain/sets/terms';
import { fieldError, zodField } from '../../core/form-problems';
import { Notice } from '../../ui/notice';
import type { PartCondition } from './present-condition';
import { Saving } from './saving';
import { SetStore } from './set-store';
import { today } from './today';

const noteSchema = recordCondition.body.shape.entries.element.shape.note;
type PartForm = FormGroup<{ grade: FormControl<Grade | null>; note: FormControl<string> }>;

/** Grades every part of a set on one date; parts left without a grade are not recorded. */
@Component({
  selector: 'tw-condition-form',
  imports: [MatButton, MatButtonToggleModule, MatFormFieldModule, MatInput, Notice, ReactiveFormsModule],
  templateUrl: './condition-form.html',
  styleUrl: './record-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ConditionForm {
  readonly parts = input.required<readonly PartCondition[]>();

  readonly recorded = output();
  readonly cancelled = output();

  private readonly store = inject(SetStore);
  private readonly fb = inject(NonNullableFormBuilder);

  protected readonly form = this.fb.group({
    notedOn: [today(), zodField(isoDate)],
    parts: this.fb.record<PartForm>(Object.fromEntries(SET_PARTS.map((part) => [part, this.partForm()]))),
  });
  protected readonly saving = new Saving(this.form);
  protected readonly noneGraded = signal(false);
  protected readonly labels = SET_PART_LABELS;
  protected readonly grades = GRADES.map((value) => ({ value, label: GRADE_LABELS[value] }));
  protected readonly fieldError = fieldError;
  protected readonly shown = computed(() =>
    this.parts().map(({ part }) => ({ part, controls: this.partOf(part).controls })),
  );

  constructor() {
    effect(() => {
      for (const { part, entry } of this.parts())
        if (entry && this.partOf(part).pristine)
          this.partOf(part).setValue({ grade: entry.grade as Grade, note: entry.note });
    });
  }

  protected save(): void {
    const parts = this.form.controls.parts.getRawValue();
    const entries = this.parts().flatMap(({ part }) => {
      const { grade, note } = parts[part] ?? { grade: null, note: '' };
      return grade === null ? [] : [{ part, grade, note }];
    });
    this.noneGraded.set(entries.length === 0);
    if (entries.length === 0) return;
    this.saving.run(
      () => this.store.recordCondition({ notedOn: this.form.controls.notedOn.value, entries }),
      () => this.recorded.emit(),
    );
  }

  private partForm(): PartForm {
    return new FormGroup({
      grade: new FormControl<Grade | null>(null),
      note: new FormControl('', { nonNullable: true, validators: zodField(noteSchema) }),
    });
  }

  private partOf(part: SetPart): PartForm {
    const form = this.form.controls.parts.controls[part];
    if (form === undefined) throw new Error(`no part ${part}`);
    return form;
  }
}
