import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';

const ICON = { caution: 'warning', error: 'error', info: 'info' } as const;

/** A line that needs reading: caution, error or information. Danger has its own part, the hazard panel. */
@Component({
  selector: 'tw-notice',
  imports: [MatIcon],
  template: `<mat-icon [svgIcon]="icon()" aria-hidden="true" />
    <div class="text"><ng-content /></div>`,
  styles: `
    :host {
      display: flex;
      gap: 10px;
      padding: 11px 14px;
      border-radius: var(--tw-corner-control);
      background: var(--mat-sys-surface-container);
      font: var(--mat-sys-body-medium);
    }
    :host(.caution) {
      background: var(--mat-sys-tertiary-container);
      color: var(--mat-sys-on-tertiary-container);
    }
    :host(.error) {
      background: var(--mat-sys-error-container);
      color: var(--mat-sys-on-error-container);
    }
    .mat-icon {
      flex: none;
      width: 20px;
      height: 20px;
    }
    .text {
      min-width: 0;
      flex: 1;
    }
    :host ::ng-deep a {
      color: inherit;
      font-weight: 700;
    }
  `,
  host: { '[class]': 'tone()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Notice {
  readonly tone = input<keyof typeof ICON>('info');
  protected readonly icon = computed(() => ICON[this.tone()]);
}
