import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { YearScaleDrawing } from '../../domain/year-scale/geometry';

let drawings = 0;

/** A drawn year scale as SVG; the parts around it say it in words or make it interactive. */
@Component({
  selector: 'tw-year-scale-drawing',
  templateUrl: './year-scale-drawing.html',
  styleUrl: './year-scale-drawing.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class YearScaleSvg {
  readonly drawing = input.required<YearScaleDrawing>();

  protected readonly shadeId = `tw-year-scale-shade-${++drawings}`;
}
