import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { formatDate } from '../../../domain/calendar/period';
import type { Paper } from '../../../domain/documents/paper';
import { CostAgainstWorth } from '../../ui/cost-against-worth';
import { PaperYearScale } from './paper-year-scale';

/** A document as a page made to print: white in every theme, the same content as its PDF. */
@Component({
  selector: 'tw-paper-view',
  imports: [CostAgainstWorth, PaperYearScale],
  templateUrl: './paper-view.html',
  styleUrl: './paper-view.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PaperView {
  readonly paper = input.required<Paper>();

  protected readonly date = computed(() => formatDate(this.paper().preparedOn));
}
