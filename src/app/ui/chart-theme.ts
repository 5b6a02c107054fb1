import { DOCUMENT } from '@angular/common';
import { DestroyRef, inject, Injectable, signal } from '@angular/core';
import { Chart, Filler, LinearScale, LineController, LineElement, PointElement, Tooltip } from 'chart.js';

/** The tokens a chart is drawn with, as colours a canvas understands. */
export interface ChartColours {
  readonly ink: string;
  readonly soft: string;
  readonly grid: string;
  readonly line: string;
  readonly shade: string;
  readonly ground: string;
}

const TOKENS: Readonly<Record<keyof ChartColours, string>> = {
  ink: '--mat-sys-on-surface',
  soft: '--tw-ink-soft',
  grid: '--mat-sys-outline-variant',
  line: '--tw-data-uplift',
  shade: '--tw-data-uplift-bg',
  ground: '--mat-sys-surface-container-lowest',
};

/**
 * Colours for charts, read from the tokens at run time and again whenever the theme changes: a canvas keeps the
 * colours it was drawn with. Registers the parts of chart.js in use and sets its font.
 */
@Injectable({ providedIn: 'root' })
export class ChartTheme {
  private readonly document = inject(DOCUMENT);
  private readonly current = signal<ChartColours>(this.read());

  readonly colours = this.current.asReadonly();

  constructor() {
    Chart.register(LineController, LineElement, PointElement, LinearScale, Tooltip, Filler);
    Chart.defaults.font.family = 'Lato, sans-serif';
    Chart.defaults.font.size = 12;

    const refresh = () => this.current.set(this.read());
    const observer = new MutationObserver(refresh);
    observer.observe(this.document.documentElement, {
      attributes: true,
      attributeFilter: ['data-theme', 'class', 'style'],
    });
    const media = this.document.defaultView?.matchMedia?.('(prefers-color-scheme: dark)');
    media?.addEventListener('change', refresh);
    inject(DestroyRef).onDestroy(() => {
      observer.disconnect();
      media?.removeEventListener('change', refresh);
    });
  }

  /** The browser itself resolves `light-dark()`, on an element nobody sees. */
  private read(): ChartColours {
    const probe = this.document.createElement('span');
    probe.hidden = true;
    this.document.body.append(probe);
    const resolve = (token: string) => {
      probe.style.color = `var(${token})`;
      return getComputedStyle(probe).color;
    };
    const colours: ChartColours = {
      ink: resolve(TOKENS.ink),
      soft: resolve(TOKENS.soft),
      grid: resolve(TOKENS.grid),
      line: resolve(TOKENS.line),
      shade: resolve(TOKENS.shade),
      ground: resolve(TOKENS.ground),
    };
    probe.remove();
    return colours;
  }
}
