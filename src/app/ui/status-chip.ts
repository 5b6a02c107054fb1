import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';

/** A state: glyph and words, never colour alone. */
@Component({
  selector: 'tw-status-chip',
  imports: [MatIcon],
  template: `<mat-icon [svgIcon]="icon()" aria-hidden="true" />{{ text() }}`,
  styles: `
    :host {
      display: inline-flex;
      align-items: center;
      gap: 6px;
      height: 24px;
      padding: 0 9px 0 7px;
      border-radius: var(--tw-corner-chip);
      background: var(--mat-sys-secondary-container);
      color: var(--mat-sys-on-secondary-container);
      font: var(--mat-sys-label-small);
      white-space: nowrap;
    }
    :host(.work) {
      background: var(--mat-sys-primary-container);
      color: var(--mat-sys-on-primary-container);
    }
    :host(.attention) {
      background: var(--mat-sys-tertiary-container);
      color: var(--mat-sys-on-tertiary-container);
    }
    :host(.done) {
      background: var(--tw-gain-container);
      color: var(--tw-on-gain-container);
    }
    :host(.stopped) {
      background: var(--tw-loss-container);
      color: var(--tw-on-loss-container);
    }
    :host(.outline) {
      background: transparent;
      box-shadow: inset 0 0 0 1px var(--mat-sys-outline);
      color: var(--mat-sys-on-surface-variant);
    }
    .mat-icon {
      width: 14px;
      height: 14px;
    }
  `,
  host: { '[class]': 'tone()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StatusChip {
  readonly tone = input<'neutral' | 'work' | 'attention' | 'done' | 'stopped' | 'outline'>('neutral');
  readonly icon = input.required<string>();
  readonly text = input.required<string>();
}
