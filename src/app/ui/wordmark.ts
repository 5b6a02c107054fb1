import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** The name, light then heavy, with the needle between. On the dial glass the needle is the glass's. */
@Component({
  selector: 'tw-wordmark',
  template: `
    <svg width="132" height="30" viewBox="0 0 132 30" role="img" aria-label="Thenworth" [class.on-glass]="onGlass()">
      <text class="then" x="50" y="22" text-anchor="end">then</text>
      <path class="needle" d="M54 2v26" />
      <text class="worth" x="58" y="22">worth</text>
    </svg>
  `,
  styles: `
    :host {
      display: inline-block;
      width: var(--tw-wordmark-width, 122px);
    }
    svg {
      width: 100%;
      height: auto;
    }
    text {
      font-family: Lato, sans-serif;
      font-size: 25px;
      fill: currentColor;
    }
    .then {
      font-weight: 300;
    }
    .worth {
      font-weight: 900;
      letter-spacing: -0.01em;
    }
    .needle {
      stroke: var(--tw-needle);
      stroke-width: 2.6;
    }
    .on-glass .needle {
      stroke: var(--tw-glass-needle);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Wordmark {
  readonly onGlass = input(false);
}
