import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { PaperYearScale as YearScale } from '../../../domain/documents/paper';
import { paperYearScaleInput } from '../../../domain/documents/year-scale';
import { drawYearScale } from '../../../domain/year-scale/geometry';
import { elementWidth } from '../../ui/element-width';
import { YearScaleSvg } from '../../ui/year-scale-drawing';

const NARROW_UNDER = 560;

/** The year scale of a document, with the amounts as the document writes them. As wide as its host. */
@Component({
  selector: 'tw-paper-year-scale',
  imports: [YearScaleSvg],
  template: '<tw-year-scale-drawing [drawing]="drawing()" />',
  styles: ':host { display: block; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'img', '[attr.aria-label]': 'scale().sentence' },
})
export class PaperYearScale {
  readonly scale = input.required<YearScale>();

  private readonly width = elementWidth(680);

  protected readonly drawing = computed(() => {
    const width = this.width();
    return drawYearScale(paperYearScaleInput(this.scale(), width < NARROW_UNDER ? 'strip-narrow' : 'strip', width));
  });
}
