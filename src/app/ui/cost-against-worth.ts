import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import {
  costAgainstWorthSentence,
  drawCostAgainstWorth,
  type CostAgainstWorthFigures,
} from '../../domain/charts/cost-against-worth';
import { elementWidth } from './element-width';

let drawings = 0;

/** Cost against worth: both bars begin at worth as found, so that the gap at their ends is the answer. */
@Component({
  selector: 'tw-cost-against-worth',
  templateUrl: './cost-against-worth.html',
  styleUrl: './cost-against-worth.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CostAgainstWorth {
  readonly figures = input.required<CostAgainstWorthFigures>();
  private readonly width = elementWidth(560);

  /** Hatches are named; two charts on a page must not share a name. */
  protected readonly id = `cost-against-worth-${++drawings}`;
  protected readonly sentence = computed(() => costAgainstWorthSentence(this.figures()));
  protected readonly drawing = computed(() => {
    const width = this.width();
    return drawCostAgainstWorth(this.figures(), { width, narrow: width < 460, fontSize: 13 });
  });
}
