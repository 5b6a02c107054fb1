import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { SetKind } from '../../domain/sets/terms';

interface Drawing {
  /** The filled body under the lines. */
  readonly body: string;
  readonly lines: string;
}

/** Front elevations on a grid of 40 units. */
const DRAWINGS: Readonly<Record<SetKind, Drawing>> = {
  radio: {
    body: 'M6 12h28v20H6z',
    lines:
      'M6 12h28v20H6zM9 32v2M31 32v2M9 16h12v12H9zM9 19h12M9 22h12M9 25h12M31 19a4 4 0 1 1-8 0a4 4 0 0 1 8 0zM27 19l2-2.500M25.500 27a1.500 1.500 0 1 1-3 0a1.500 1.500 0 0 1 3 0zM31.500 27a1.500 1.500 0 1 1-3 0a1.500 1.500 0 0 1 3 0z',
  },
  phonograph: {
    body: 'M8 26h20v8H8z',
    lines: 'M8 26h20v8H8zM6 34h24M10 26v-2h16v2M18 24v-4M18 20c4 0 6-2 7-6M22 15l12-9v14l-10-3M28 30h4v-3',
  },
  combination: {
    body: 'M9 7h22v26H9z',
    lines: 'M9 7h22v26H9zM7 7h26M11 33v2M29 33v2M12 10h16v6H12zM15 13h10M12 19h16v11H12zM16 19v11M20 19v11M24 19v11',
  },
  television: {
    body: 'M7 8h26v22H7z',
    lines:
      'M7 8h26v22H7zM10 30l-2 5M30 30l2 5M27 18a7 7 0 1 1-14 0a7 7 0 0 1 14 0zM25 18a5 5 0 1 1-10 0a5 5 0 0 1 10 0zM13 27a1 1 0 1 1-2 0a1 1 0 0 1 2 0zM29 27a1 1 0 1 1-2 0a1 1 0 0 1 2 0zM16 27h8',
  },
  amplifier: {
    body: 'M5 25h30v8H5z',
    lines:
      'M5 25h30v8H5zM8 33v2M32 33v2M7 15h7v10H7zM17 25v-8a2 2 0 0 1 4 0v8M23 25v-8a2 2 0 0 1 4 0v8M29 25v-8a2 2 0 0 1 4 0v8M10 29h4M18 29h4M26 29h4',
  },
};

/** A small line drawing of a kind of set, where there is no photograph. Decorative. */
@Component({
  selector: 'tw-kind-drawing',
  template: `
    <svg viewBox="0 0 40 40" aria-hidden="true" focusable="false">
      <path class="body" [attr.d]="drawing().body" />
      <path class="lines" [attr.d]="drawing().lines" />
    </svg>
  `,
  styles: `
    :host {
      display: block;
    }
    svg {
      display: block;
      width: 100%;
      height: auto;
    }
    .body {
      fill: var(--mat-sys-surface-container-high);
    }
    .lines {
      fill: none;
      stroke: var(--mat-sys-on-surface-variant);
      stroke-width: 1.2;
      stroke-linecap: round;
      stroke-linejoin: round;
      vector-effect: non-scaling-stroke;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class KindDrawing {
  readonly kind = input.required<SetKind>();

  protected readonly drawing = computed(() => DRAWINGS[this.kind()]);
}
