import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { yearScaleInput, type YearScaleContent } from '../../domain/year-scale/content';
import { drawYearScale } from '../../domain/year-scale/geometry';
import { elementWidth } from './element-width';
import { YearScaleSvg } from './year-scale-drawing';

const NARROW_UNDER = 560;

/** The year scale as a strip across a panel: looked at, not moved. As wide as its host. */
@Component({
  selector: 'tw-year-scale-strip',
  imports: [YearScaleSvg],
  template: '<tw-year-scale-drawing [drawing]="drawing()" />',
  styles: ':host { display: block; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'img', '[attr.aria-label]': 'drawing().sentence' },
})
export class YearScaleStrip {
  readonly content = input.required<YearScaleContent>();

  private readonly width = elementWidth(1020);

  protected readonly drawing = computed(() => {
    const width = this.width();
    return drawYearScale(yearScaleInput(this.content(), width < NARROW_UNDER ? 'strip-narrow' : 'strip', width));
  });
}
