import { DOCUMENT } from '@angular/common';
import { inject, Injectable, signal } from '@angular/core';

export const THEMES = ['system', 'light', 'dark'] as const;
export type Theme = (typeof THEMES)[number];
const KEY = 'thenworth.theme';

/** The theme a person chose for this browser; `system` follows the machine. */
@Injectable({ providedIn: 'root' })
export class ThemeStore {
  private readonly document = inject(DOCUMENT);
  private readonly chosen = signal<Theme>(this.saved());
  readonly theme = this.chosen.asReadonly();

  constructor() {
    this.apply(this.chosen());
  }

  choose(theme: Theme): void {
    this.chosen.set(theme);
    this.apply(theme);
    this.document.defaultView?.localStorage.setItem(KEY, theme);
  }

  private saved(): Theme {
    const text = this.document.defaultView?.localStorage.getItem(KEY);
    return THEMES.find((theme) => theme === text) ?? 'system';
  }

  private apply(theme: Theme): void {
    const root = this.document.documentElement;
    if (theme === 'system') root.removeAttribute('data-theme');
    else root.dataset['theme'] = theme;
  }
}
