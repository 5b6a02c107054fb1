import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatIcon } from '@angular/material/icon';

/** Keeps the restated price and the set's worth apart, in words. */
@Component({
  selector: 'tw-not-a-worth',
  imports: [MatIcon],
  template: `
    <section class="tw-panel panel" aria-labelledby="tw-not-a-worth">
      <h2 class="heading" id="tw-not-a-worth">What a restated price is not</h2>
      <p class="said">
        The restated price says what buyers gave up when the set was new. It is not what the set is worth.
      </p>
      <ul class="list">
        <li>
          <mat-icon svgIcon="close" aria-hidden="true" /><span
            ><b>Not a market value.</b> That is found from sales of sets like it.</span
          >
        </li>
        <li>
          <mat-icon svgIcon="close" aria-hidden="true" /><span
            ><b>Not an insured sum.</b> That follows the cost of replacing the set.</span
          >
        </li>
        <li>
          <mat-icon svgIcon="check" aria-hidden="true" /><span
            ><b>A fair way to say</b> what the first owner gave up to buy it.</span
          >
        </li>
      </ul>
    </section>
  `,
  styles: `
    :host {
      display: block;
      min-width: 0;
    }
    .panel {
      padding: 16px 20px 12px;
    }
    .heading {
      margin: 0 0 8px;
      font: var(--mat-sys-title-medium);
    }
    .said {
      margin: 0 0 12px;
    }
    .list {
      margin: 0;
      padding: 0;
      list-style: none;
    }
    .list li {
      display: flex;
      gap: 10px;
      padding: 10px 0;
      border-top: 1px solid var(--mat-sys-outline-variant);
    }
    .list mat-icon {
      flex: none;
      color: var(--mat-sys-on-surface-variant);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NotAWorth {}
