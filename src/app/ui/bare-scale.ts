import { ChangeDetectionStrategy, Component, input } from '@angular/core';

const TICKS = Array.from({ length: 41 }, (_, at) => ({ x: 4 + at * 6, y: at % 10 === 0 ? 20 : at % 5 === 0 ? 14 : 9 }));

/** The year scale without a price: bare when there is nothing yet, with a gap when something failed, swept while waiting. */
@Component({
  selector: 'tw-bare-scale',
  template: `
    <svg viewBox="0 0 248 44" width="248" height="44" aria-hidden="true">
      @for (tick of ticks; track tick.x) {
        @if (state() !== 'gap' || tick.x < 106 || tick.x > 142) {
          <path class="tick" [attr.d]="'M' + tick.x + ' 22v' + tick.y" />
        }
      }
      @if (state() === 'gap') {
        <path class="base" d="M4 22h102M142 22h102" />
      } @else {
        <path class="base" d="M4 22h240" />
      }
      @if (state() === 'sweep') {
        <path class="needle" d="M4 4v36" />
      }
    </svg>
  `,
  styles: `
    svg {
      max-width: 100%;
    }
    .tick,
    .base {
      stroke: var(--mat-sys-outline);
      stroke-width: 1.2;
    }
    .needle {
      stroke: var(--tw-needle);
      stroke-width: 3;
      animation: sweep 1.8s ease-in-out infinite alternate;
    }
    @keyframes sweep {
      to {
        transform: translateX(240px);
      }
    }
    @media (prefers-reduced-motion: reduce) {
      .needle {
        animation: none;
        transform: translateX(120px);
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BareScale {
  readonly state = input<'bare' | 'gap' | 'sweep'>('bare');
  protected readonly ticks = TICKS;
}
