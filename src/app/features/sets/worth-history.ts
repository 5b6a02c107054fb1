import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { Worth } from '../../../contracts/sets';
import { formatDate } from '../../../domain/calendar/period';
import { formatMoney } from '../../../domain/money/money';
import { VALUE_TYPE_LABELS, WORTH_KIND_LABELS } from '../../../domain/sets/terms';
import { StatusChip } from '../../ui/status-chip';

/** Every worth recorded, newest first; nothing is overwritten. Presentational. */
@Component({
  selector: 'tw-worth-history',
  imports: [StatusChip],
  template: `
    <section class="tw-panel" role="region" tabindex="0" aria-label="Worths on record">
      <table class="tw-table">
        <thead>
          <tr>
            <th scope="col">Worth</th>
            <th scope="col" class="tw-num">Amount</th>
            <th scope="col" class="tw-num">Range</th>
            <th scope="col">Type of value</th>
            <th scope="col">Effective</th>
            <th scope="col">Who says so, on what basis</th>
            <th scope="col">Recorded</th>
          </tr>
        </thead>
        <tbody>
          @for (row of rows(); track row.id) {
            <tr [class.past]="!row.inForce">
              <th scope="row">
                {{ row.kind }}
                @if (row.inForce) {
                  <tw-status-chip tone="done" icon="check" text="In force" />
                }
              </th>
              <td class="tw-num strong" data-label="Amount">{{ row.amount }}</td>
              <td class="tw-num" data-label="Range">{{ row.range }}</td>
              <td data-label="Type of value">{{ row.type }}</td>
              <td class="nowrap" data-label="Effective">{{ row.effective }}</td>
              <td class="basis" data-label="Who says so">
                {{ row.saidBy }}<span class="tw-mute">{{ row.basis }}</span>
              </td>
              <td class="tw-mute" data-label="Recorded">{{ row.recorded }}</td>
            </tr>
          }
        </tbody>
      </table>
    </section>
  `,
  styles: `
    :host {
      display: block;
      min-width: 0;
    }
    section {
      overflow-x: auto;
    }
    tbody th {
      font: var(--mat-sys-title-small);
      color: var(--mat-sys-on-surface);
      vertical-align: middle;
    }
    tw-status-chip {
      margin-left: 8px;
    }
    .strong {
      font-weight: 700;
    }
    .past {
      color: var(--mat-sys-on-surface-variant);
    }
    .past .strong {
      font-weight: 400;
    }
    .nowrap {
      white-space: nowrap;
    }
    .basis {
      min-width: 220px;
    }
    .basis span {
      display: block;
    }
    @media (max-width: 839px) {
      thead {
        display: none;
      }
      tr {
        display: block;
        padding: 6px 0;
        border-bottom: 1px solid var(--mat-sys-outline-variant);
      }
      tbody th,
      td {
        display: block;
        padding: 3px 0;
        border: 0;
        text-align: left;
        white-space: normal;
      }
      td.tw-num {
        text-align: left;
      }
      td::before {
        content: attr(data-label) ': ';
        color: var(--mat-sys-on-surface-variant);
        font-weight: 400;
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WorthHistory {
  readonly worths = input.required<readonly Worth[]>();
  /** Ids of the worths in force. */
  readonly inForce = input.required<readonly number[]>();

  protected readonly rows = computed(() =>
    this.worths().map((worth) => {
      const money = (value: { amount: string; currency: string } | null) =>
        value === null ? 'none' : formatMoney(value.amount, value.currency);
      const { low, high } = worth;
      return {
        id: worth.id,
        inForce: this.inForce().includes(worth.id),
        kind: WORTH_KIND_LABELS[worth.kind],
        amount: money(worth.amount),
        range: low === null && high === null ? '' : `${money(low)} to ${money(high)}`,
        type: VALUE_TYPE_LABELS[worth.valueType],
        effective: formatDate(worth.effectiveOn),
        saidBy: worth.saidBy,
        basis: worth.basis,
        recorded: `${formatDate(worth.recordedAt)}, ${worth.recordedBy}`,
      };
    }),
  );
}
