import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { ConditionEntry } from '../../../contracts/sets';
import { formatDate } from '../../../domain/calendar/period';
import { SET_PART_LABELS, type SetKind } from '../../../domain/sets/terms';
import { GradeBars } from '../../ui/grade-bars';
import { presentCondition } from './present-condition';

/** The present condition of each part that has been graded. Presentational. */
@Component({
  selector: 'tw-condition-summary',
  imports: [GradeBars, RouterLink],
  template: `
    <section class="tw-panel">
      <header>
        <h2>Condition</h2>
        @if (newest(); as date) {
          <span class="tw-mute">{{ date }}</span>
        }
      </header>
      @if (graded().length > 0) {
        <dl>
          @for (entry of graded(); track entry.part) {
            <div>
              <dt>{{ labels[entry.part] }}</dt>
              <dd><tw-grade-bars [grade]="entry.grade" /></dd>
            </div>
          }
        </dl>
      } @else {
        <p class="tw-mute">No part has been graded yet.</p>
      }
      @if (mayEdit()) {
        <a [routerLink]="['condition']">Record condition</a>
      }
    </section>
  `,
  styles: `
    :host {
      display: block;
    }
    .tw-panel {
      padding: 12px 16px 14px;
    }
    header {
      display: flex;
      justify-content: space-between;
      align-items: baseline;
    }
    h2 {
      margin: 0;
      font: var(--mat-sys-title-medium);
    }
    dl {
      margin: 6px 0 8px;
    }
    dl div {
      display: flex;
      justify-content: space-between;
      gap: 12px;
      padding: 8px 0;
      border-bottom: 1px solid var(--mat-sys-outline-variant);
    }
    dd {
      margin: 0;
      color: var(--mat-sys-on-surface-variant);
    }
    p {
      margin: 6px 0 8px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ConditionSummary {
  readonly kind = input.required<SetKind>();
  readonly entries = input.required<readonly ConditionEntry[]>();
  readonly mayEdit = input(false);

  protected readonly labels = SET_PART_LABELS;
  protected readonly graded = computed(() =>
    presentCondition(this.kind(), this.entries()).flatMap(({ entry }) => (entry ? [entry] : [])),
  );
  protected readonly newest = computed(() => {
    const dates = this.graded().map(({ notedOn }) => notedOn);
    const last = dates.sort().at(-1);
    return last === undefined ? '' : formatDate(last);
  });
}
