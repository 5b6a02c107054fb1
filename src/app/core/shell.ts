import { ChangeDetectionStrategy, Component, computed, ElementRef, inject, viewChild } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatMenu, MatMenuItem, MatMenuTrigger } from '@angular/material/menu';
import { MatSnackBar } from '@angular/material/snack-bar';
import { NavigationEnd, Router, RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import { filter, fromEvent, map, merge, of } from 'rxjs';
import { ROLE_LABELS } from '../../domain/access/policy';
import { Notice } from '../ui/notice';
import { Wordmark } from '../ui/wordmark';
import { ApiProblem } from './api-client';
import { PLACES } from './navigation';
import { SessionStore } from './session';
import { THEMES, ThemeStore, type Theme } from './theme';

const THEME_LABELS: Readonly<Record<Theme, { label: string; icon: string }>> = {
  system: { label: 'Theme of this machine', icon: 'contrast' },
  light: { label: 'Light', icon: 'light_mode' },
  dark: { label: 'Dark', icon: 'dark_mode' },
};

/** Top bar, dock and the page between; moves the focus to the new page's heading. */
@Component({
  selector: 'tw-shell',
  imports: [
    MatButton,
    MatIcon,
    MatIconButton,
    MatMenu,
    MatMenuItem,
    MatMenuTrigger,
    Notice,
    RouterLink,
    RouterLinkActive,
    RouterOutlet,
    Wordmark,
  ],
  templateUrl: './shell.html',
  styleUrl: './shell.scss',
  host: { '(document:keydown)': 'focusSearch($event)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Shell {
  private readonly router = inject(Router);
  private readonly sessions = inject(SessionStore);
  private readonly themes = inject(ThemeStore);
  private readonly snackBar = inject(MatSnackBar);
  private readonly main = viewChild.required<ElementRef<HTMLElement>>('main');
  private readonly find = viewChild<ElementRef<HTMLInputElement>>('find');

  protected readonly user = this.sessions.user;
  protected readonly needsSetup = computed(() => this.sessions.session()?.needsSetup === true);
  protected readonly roleLabel = computed(() => ROLE_LABELS[this.user()?.role ?? 'collector']);
  protected readonly initials = computed(() =>
    (this.user()?.name ?? '')
      .split(/\s+/)
      .map((word) => word.charAt(0))
      .slice(0, 2)
      .join('')
      .toUpperCase(),
  );
  protected readonly places = computed(() => {
    this.user(); // the policy answers for whoever is signed in
    return PLACES.filter(({ action }) => action === null || this.sessions.can(action));
  });
  protected readonly theme = this.themes.theme;
  protected readonly themeChoices = THEMES.map((theme) => ({ theme, ...THEME_LABELS[theme] }));
  protected readonly offline = toSignal(
    merge(
      of(!navigator.onLine),
      fromEvent(window, 'offline').pipe(map(() => true)),
      fromEvent(window, 'online').pipe(map(() => false)),
    ),
    { initialValue: false },
  );
  private readonly address = toSignal(
    this.router.events.pipe(
      filter((event) => event instanceof NavigationEnd),
      map((event) => event.urlAfterRedirects),
    ),
    { initialValue: '' },
  );
  /** Papers and signing in have the whole window. */
  protected readonly bare = computed(() => /^\/(papers|sign-in)\b/.test(this.address()));

  constructor() {
    let path = '';
    this.router.events.pipe(filter((event) => event instanceof NavigationEnd)).subscribe((event) => {
      const next = event.urlAfterRedirects.split(/[?#]/)[0] ?? '';
      if (path !== '' && path !== next) setTimeout(() => this.focusHeading());
      path = next;
    });
  }

  protected search(text: string): void {
    void this.router.navigate(['/sets'], { queryParams: { q: text.trim() || null } });
  }

  protected chooseTheme(theme: Theme): void {
    this.themes.choose(theme);
  }

  protected signOut(): void {
    this.sessions.signOut().subscribe({
      next: () => void this.router.navigate(['/then-and-now']),
      error: (error: unknown) => {
        if (error instanceof ApiProblem) this.snackBar.open(`You are still signed in. ${error.message}`, 'Close');
      },
    });
  }

  protected focusSearch(event: KeyboardEvent): void {
    const target = event.target as HTMLElement;
    const typing = target.isContentEditable || /^(input|textarea|select)$/i.test(target.tagName);
    if (event.key !== '/' || typing || event.ctrlKey || event.metaKey || event.altKey) return;
    const find = this.find()?.nativeElement;
    if (find === undefined) return;
    event.preventDefault();
    find.focus();
  }

  protected skip(event: Event): void {
    event.preventDefault();
    this.focusHeading();
  }

  private focusHeading(): void {
    const main = this.main().nativeElement;
    const heading = main.querySelector<HTMLElement>('h1');
    if (heading && !heading.hasAttribute('tabindex')) heading.tabIndex = -1;
    (heading ?? main).focus({ preventScroll: true });
  }
}
