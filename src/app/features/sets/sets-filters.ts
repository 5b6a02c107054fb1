import { ChangeDetectionStrategy, Component, effect, input, output, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import { MatInput } from '@angular/material/input';
import { debounceTime, distinctUntilChanged } from 'rxjs';
import { SET_SORTS } from '../../../contracts/sets';
import { SET_KIND_LABELS, SET_KINDS } from '../../../domain/sets/terms';
import { SET_SORT_LABELS, SET_STATE_LABELS, SET_STATES, type SetsQuery } from './sets-query';

const TYPING_PAUSE_MS = 300;

export interface QueryChange {
  readonly part: Partial<SetsQuery>;
  /** Typing goes on: the address is replaced, so that Back leaves the search at once. */
  readonly replace: boolean;
}

/** Search, filters and order of the list of sets. Presentational. */
@Component({
  selector: 'tw-sets-filters',
  imports: [MatButton, MatFormFieldModule, MatIcon, MatInput, ReactiveFormsModule],
  templateUrl: './sets-filters.html',
  styleUrl: './sets-filters.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetsFilters {
  readonly query = input.required<SetsQuery>();
  readonly makers = input.required<readonly string[]>();
  readonly owners = input.required<readonly { readonly id: number; readonly name: string }[]>();
  readonly narrowed = input.required<boolean>();

  readonly queryChange = output<QueryChange>();
  readonly clear = output();

  protected readonly kinds = SET_KINDS.map((value) => ({ value, label: SET_KIND_LABELS[value] }));
  protected readonly states = SET_STATES.map((value) => ({ value, label: SET_STATE_LABELS[value] }));
  protected readonly sorts = SET_SORTS.map((value) => ({ value, label: SET_SORT_LABELS[value] }));
  /** On phones the filters stay folded until asked for. */
  protected readonly unfolded = signal(false);

  protected readonly search = new FormControl('', { nonNullable: true });

  constructor() {
    effect(() => {
      const { q } = this.query();
      // What is being typed stays; only an address that says something else is written over it.
      if (q.trim() !== this.search.value.trim()) this.search.setValue(q, { emitEvent: false });
    });
    this.search.valueChanges
      .pipe(debounceTime(TYPING_PAUSE_MS), distinctUntilChanged(), takeUntilDestroyed())
      .subscribe(() => this.find());
  }

  protected find(): void {
    const q = this.search.value.trim();
    const before = this.query().q;
    if (q !== before) this.queryChange.emit({ part: { q }, replace: before !== '' });
  }

  protected pick(name: 'kind' | 'maker' | 'ownerId' | 'state' | 'sort', event: Event): void {
    const { value } = event.target as HTMLSelectElement;
    this.queryChange.emit({ part: { [name]: value }, replace: false });
  }
}
