import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { Dec } from '../../domain/money/decimal';
import { formatMoney } from '../../domain/money/money';

/** Gain or loss: triangle, sign, amount and colour, all four; even is two bars. */
@Component({
  selector: 'tw-verdict-mark',
  template: `
    <svg viewBox="0 0 11 11" width="11" height="11" aria-hidden="true"><path [attr.d]="shape()" /></svg>
    {{ text() }}
  `,
  styles: `
    :host {
      display: inline-flex;
      align-items: center;
      gap: 6px;
      font: var(--mat-sys-label-large);
      white-space: nowrap;
      color: var(--mat-sys-on-surface-variant);
    }
    :host(.up) {
      color: var(--tw-gain);
    }
    :host(.down) {
      color: var(--tw-loss);
    }
    svg {
      fill: currentColor;
    }
  `,
  host: { '[class.up]': 'sign() > 0', '[class.down]': 'sign() < 0' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class VerdictMark {
  /** Decimal text, may be negative. */
  readonly amount = input.required<string>();
  readonly currency = input('USD');
  /** What follows the amount, such as «at likely hours». */
  readonly label = input('');
  protected readonly sign = computed(() => Math.sign(new Dec(this.amount()).toDecimalPlaces(0).toNumber()));
  protected readonly shape = computed(() =>
    this.sign() > 0 ? 'M5.5 1 11 10H0z' : this.sign() < 0 ? 'M5.5 10 0 1h11z' : 'M0 2h11v2.4H0zM0 6.6h11V9H0z',
  );
  protected readonly text = computed(() =>
    [
      this.sign() === 0 ? 'Even' : formatMoney(this.amount(), this.currency(), { whole: true, signed: true }),
      this.label(),
    ]
      .filter((part) => part !== '')
      .join(' '),
  );
}
