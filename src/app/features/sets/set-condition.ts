import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { formatDate } from '../../../domain/calendar/period';
import { SET_PART_LABELS } from '../../../domain/sets/terms';
import { GradeBars } from '../../ui/grade-bars';
import { ConditionForm } from './condition-form';
import { presentCondition } from './present-condition';
import { SetStore } from './set-store';

/** The condition of each part, its history by date, and recording it anew. */
@Component({
  selector: 'tw-set-condition',
  imports: [ConditionForm, GradeBars, MatButton],
  templateUrl: './set-condition.html',
  styleUrl: './set-condition.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetCondition {
  protected readonly store = inject(SetStore);
  protected readonly recording = signal(false);
  protected readonly labels = SET_PART_LABELS;
  protected readonly date = formatDate;

  protected readonly parts = computed(() => {
    const set = this.store.set();
    return set ? presentCondition(set.kind, set.condition) : [];
  });
  /** Entries by the date they were noted on, newest first. */
  protected readonly days = computed(() => {
    const entries = this.store.set()?.condition ?? [];
    const dates = [...new Set(entries.map(({ notedOn }) => notedOn))].sort().reverse();
    return dates.map((notedOn) => ({ notedOn, entries: entries.filter((entry) => entry.notedOn === notedOn) }));
  });
}
