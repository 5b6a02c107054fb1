import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { HazardPanel } from '../../ui/hazard-panel';
import { YearScaleStrip } from '../../ui/year-scale-strip';
import { ConditionSummary } from './condition-summary';
import { EstimatesOfSet } from './estimates-of-set';
import { PriceReading } from './price-reading';
import { SetFacts } from './set-facts';
import { SetFigures } from './set-figures';
import { SetStore } from './set-store';
import { WorthChart } from './worth-chart';

/** A set at a glance: what can hurt, the four figures, cost against worth, and what is on record. */
@Component({
  selector: 'tw-set-overview',
  imports: [
    ConditionSummary,
    EstimatesOfSet,
    HazardPanel,
    PriceReading,
    RouterLink,
    SetFacts,
    SetFigures,
    WorthChart,
    YearScaleStrip,
  ],
  templateUrl: './set-overview.html',
  styleUrl: './set-overview.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetOverview {
  protected readonly store = inject(SetStore);

  protected readonly texts = computed(() => {
    const set = this.store.set();
    return [
      { heading: 'Provenance', text: set?.provenance ?? '' },
      { heading: 'Alterations', text: set?.alterations ?? '' },
      { heading: 'Notes', text: set?.notes ?? '' },
    ].filter(({ text }) => text !== '');
  });
}
