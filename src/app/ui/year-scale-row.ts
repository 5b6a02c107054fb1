import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { yearScaleInput, type YearScaleContent } from '../../domain/year-scale/content';
import { drawYearScale } from '../../domain/year-scale/geometry';
import { YearScaleSvg } from './year-scale-drawing';

/** The year scale in a table's row: decades and both needles. */
@Component({
  selector: 'tw-year-scale-row',
  imports: [YearScaleSvg],
  template: '<tw-year-scale-drawing [drawing]="drawing()" />',
  styles: ':host { display: block; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'img', '[attr.aria-label]': 'drawing().sentence', '[style.width.px]': 'width()' },
})
export class YearScaleRow {
  readonly content = input.required<YearScaleContent>();
  /** In px. */
  readonly width = input(190);

  protected readonly drawing = computed(() => drawYearScale(yearScaleInput(this.content(), 'row', this.width())));
}
