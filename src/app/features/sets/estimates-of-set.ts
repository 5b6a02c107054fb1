import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { EstimateSummary } from '../../../contracts/estimates';
import { formatDate } from '../../../domain/calendar/period';
import { VerdictMark } from '../../ui/verdict-mark';
import { wholeText } from './set-words';

/** The estimates of one set with their totals and gaps. Presentational. */
@Component({
  selector: 'tw-estimates-of-set',
  imports: [MatButton, RouterLink, VerdictMark],
  template: `
    <section class="tw-panel">
      <h2>Estimates</h2>
      @if (failed()) {
        <p>The estimates did not load. <button matButton type="button" (click)="retry.emit()">Try again</button></p>
      } @else {
        <ul>
          @for (estimate of estimates(); track estimate.id) {
            <li>
              <a [routerLink]="['/estimates', estimate.id]">{{ estimate.title }}</a>
              <span class="amount">{{ wholeText(estimate.total) }}</span>
              <span class="tw-basis">
                {{ estimate.number }}, {{ date(estimate.updatedAt) }}{{ estimate.archived ? ', archived' : '' }}
              </span>
              @if (estimate.gap !== null) {
                <tw-verdict-mark [amount]="estimate.gap" [currency]="estimate.total.currency" />
              }
            </li>
          } @empty {
            <li class="tw-mute">No estimate yet.</li>
          }
        </ul>
      }
    </section>
  `,
  styles: `
    :host {
      display: block;
    }
    h2 {
      margin: 0 0 4px;
      font: var(--mat-sys-title-medium);
    }
    ul {
      margin: 0;
      padding: 0;
      list-style: none;
    }
    li {
      display: grid;
      grid-template-columns: minmax(0, 1fr) auto;
      gap: 2px 12px;
      padding: 11px 0;
      border-top: 1px solid var(--mat-sys-outline-variant);
    }
    a {
      font: var(--mat-sys-title-small);
      color: var(--mat-sys-on-surface);
    }
    .amount {
      font-weight: 700;
      font-kerning: none;
      text-align: right;
    }
    tw-verdict-mark {
      justify-self: end;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EstimatesOfSet {
  readonly estimates = input.required<readonly EstimateSummary[]>();
  readonly failed = input(false);

  readonly retry = output();

  protected readonly wholeText = wholeText;
  protected readonly date = formatDate;
}
