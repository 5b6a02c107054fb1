import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/**
 * One figure of a group (`.tw-figures`): label, amount, range, basis line. Then is light, now is heavy; an unknown
 * amount is words, with a way to fix it as content. No basis, no figure.
 */
@Component({
  selector: 'tw-figure',
  template: `
    <div class="label">{{ label() }}</div>
    <div class="amount" [class]="weight()">{{ amount() }}</div>
    @if (range()) {
      <div class="range">
        <svg class="whisker" viewBox="0 0 22 10" width="22" height="10" aria-hidden="true">
          <path d="M1 1v8M21 1v8M1 5h20" />
        </svg>
        {{ range() }}
      </div>
    }
    <div class="more"><ng-content /></div>
    <div class="tw-basis">{{ basis() }}</div>
  `,
  styles: `
    :host {
      display: block;
      min-width: 0;
      padding: 10px var(--tw-5) 6px;
      border-left: 1px solid var(--mat-sys-outline-variant);
      margin-left: -1px;
    }
    :host(:first-child) {
      padding-left: 0;
      border-left-color: transparent;
    }
    .label {
      font: var(--mat-sys-label-medium);
      color: var(--mat-sys-on-surface-variant);
    }
    .amount {
      font:
        900 32px/38px Lato,
        sans-serif;
      letter-spacing: -0.015em;
      margin-top: 2px;
      white-space: nowrap;
      font-kerning: none;
    }
    .amount.light {
      font-weight: 300;
      letter-spacing: -0.02em;
    }
    .amount.words {
      font:
        700 20px/28px Lato,
        sans-serif;
      padding: 5px 0;
      letter-spacing: 0;
      white-space: normal;
    }
    .range {
      display: flex;
      align-items: center;
      gap: 7px;
      margin-top: 3px;
      font: var(--mat-sys-label-medium);
    }
    .whisker {
      flex: none;
      fill: none;
      stroke: var(--mat-sys-on-surface-variant);
      stroke-width: 1.4;
    }
    .more {
      font: var(--mat-sys-label-medium);
      margin-top: 2px;
    }
    .more:empty {
      display: none;
    }
    .tw-basis {
      margin-top: 2px;
    }
    @media (max-width: 839px) {
      :host {
        padding: 10px 12px 14px 14px;
        border-bottom: 1px solid var(--mat-sys-outline-variant);
        margin-bottom: -1px;
      }
      :host(:nth-child(odd)) {
        padding-left: 0;
        border-left-color: transparent;
      }
      .amount {
        font-size: 27px;
        line-height: 34px;
      }
      .range,
      .tw-basis {
        font-size: 12px;
        line-height: 16px;
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Figure {
  readonly label = input.required<string>();
  readonly amount = input.required<string>();
  readonly weight = input<'light' | 'heavy' | 'words'>('heavy');
  readonly range = input<string | null>(null);
  readonly basis = input.required<string>();
}
