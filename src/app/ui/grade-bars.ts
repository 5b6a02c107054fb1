import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { GRADE_LABELS, GRADES, type Grade } from '../../domain/sets/terms';

/** A grade of condition as words and five bars. */
@Component({
  selector: 'tw-grade-bars',
  template: `
    <span class="word">{{ label() }}</span>
    <span class="bars" aria-hidden="true">
      @for (step of steps; track step) {
        <i [class.on]="step <= grade()"></i>
      }
    </span>
  `,
  styles: `
    :host {
      display: inline-flex;
      align-items: center;
      gap: 12px;
    }
    .bars {
      display: inline-flex;
      gap: 3px;
      margin-left: auto;
    }
    i {
      width: 16px;
      height: 8px;
      border-radius: 1px;
      box-shadow: inset 0 0 0 1px var(--mat-sys-outline);
    }
    i.on {
      background: var(--mat-sys-secondary);
      box-shadow: none;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class GradeBars {
  readonly grade = input.required<number>();
  protected readonly steps = GRADES;
  protected readonly label = computed(() => GRADE_LABELS[this.grade() as Grade]);
}
