import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { formatPeriod, type Period } from '../../../domain/calendar/period';

/** A period without a published figure: which needle it concerns, why in words, and the nearest published periods. */
export interface RefusedPeriod {
  readonly which: 'from' | 'to';
  readonly detail: string;
  readonly neighbours: readonly Period[];
}

/** Says why nothing was restated and offers the neighbours; nothing is interpolated. */
@Component({
  selector: 'tw-refusal',
  imports: [MatButton],
  template: `
    <div class="refusal" role="status">
      <p class="why">{{ refused().detail }} Nothing is estimated in its place.</p>
      <div class="neighbours">
        @for (choice of choices(); track choice.period) {
          <button matButton="outlined" type="button" (click)="choose.emit(choice.period)">{{ choice.text }}</button>
        }
      </div>
    </div>
  `,
  styles: `
    .refusal {
      display: flex;
      flex-wrap: wrap;
      align-items: center;
      justify-content: space-between;
      gap: 12px;
      padding: 12px 16px;
      margin-bottom: 16px;
      border-radius: var(--tw-corner-panel);
      background: var(--mat-sys-tertiary-container);
      color: var(--mat-sys-on-tertiary-container);
    }
    .why {
      margin: 0;
    }
    .neighbours {
      display: flex;
      flex-wrap: wrap;
      gap: 8px;
      --mat-button-outlined-label-text-color: var(--mat-sys-on-tertiary-container);
      --mat-button-outlined-outline-color: var(--mat-sys-on-tertiary-container);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Refusal {
  readonly refused = input.required<RefusedPeriod>();
  readonly choose = output<Period>();

  protected readonly choices = computed(() =>
    this.refused().neighbours.map((period) => ({ period, text: `Use ${formatPeriod(period)}` })),
  );
}
