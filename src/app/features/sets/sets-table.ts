import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import { RouterLink } from '@angular/router';
import type { SetSummary } from '../../../contracts/sets';
import { SET_KIND_LABELS } from '../../../domain/sets/terms';
import { SetThumbnail } from './set-thumbnail';
import { priceText, wholeText } from './set-words';
import type { SetSort } from './sets-query';

interface Column {
  readonly label: string;
  readonly numeric: boolean;
  /** Orders by this column; the second is the other way round, where there is one. */
  readonly sorts: readonly SetSort[];
}

const COLUMNS: readonly Column[] = [
  { label: 'Set', numeric: false, sorts: ['maker'] },
  { label: 'Number', numeric: false, sorts: ['number'] },
  { label: 'Year', numeric: false, sorts: ['year', '-year'] },
  { label: 'Owner', numeric: false, sorts: [] },
  { label: 'Cost when new', numeric: true, sorts: [] },
  { label: 'Today’s money', numeric: true, sorts: [] },
  { label: 'As found', numeric: true, sorts: [] },
  { label: 'Restored', numeric: true, sorts: ['-worth'] },
];

/** Sets as rows, for windows from 840 px up. Presentational. */
@Component({
  selector: 'tw-sets-table',
  imports: [MatIcon, RouterLink, SetThumbnail],
  templateUrl: './sets-table.html',
  styleUrl: './sets-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetsTable {
  readonly sets = input.required<readonly SetSummary[]>();
  readonly sort = input.required<SetSort>();

  readonly sortChange = output<SetSort>();

  protected readonly columns = COLUMNS;
  protected readonly kindLabels = SET_KIND_LABELS;
  protected readonly priceText = priceText;
  protected readonly wholeText = wholeText;

  protected direction({ sorts }: Column): 'ascending' | 'descending' | null {
    const sort = this.sort();
    if (!sorts.includes(sort)) return null;
    return sort.startsWith('-') ? 'descending' : 'ascending';
  }

  protected orderBy({ sorts }: Column): void {
    const next = sorts[(sorts.indexOf(this.sort()) + 1) % sorts.length];
    if (next !== undefined) this.sortChange.emit(next);
  }
}
