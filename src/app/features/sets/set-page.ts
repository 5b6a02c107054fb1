import { ChangeDetectionStrategy, Component, computed, effect, inject, signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatMenuModule } from '@angular/material/menu';
import { ActivatedRoute, NavigationEnd, Router, RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import { filter, map } from 'rxjs';
import { getAppraisalSheetPdf, getRestorationEstimatePdf } from '../../../contracts/papers';
import { PAPER_SIZES } from '../../../domain/estimate/terms';
import { addressOf, ApiProblem } from '../../core/api-client';
import { PageTitle } from '../../core/page-title';
import { Confirm } from '../../ui/confirm';
import { Failed } from '../../ui/failed';
import { Notice } from '../../ui/notice';
import { SkeletonRows } from '../../ui/skeleton-rows';
import { StatusChip } from '../../ui/status-chip';
import { SetStore } from './set-store';
import { inALine, setName } from './set-words';

const PAPER_NAMES = { letter: 'Letter', a4: 'A4' } as const;

/** The page of the set in the address: what it is and what can be done; its tabs are child pages. */
@Component({
  selector: 'tw-set-page',
  imports: [
    Failed,
    MatButton,
    MatIcon,
    MatIconButton,
    MatMenuModule,
    Notice,
    RouterLink,
    RouterLinkActive,
    RouterOutlet,
    SkeletonRows,
    StatusChip,
  ],
  providers: [SetStore],
  templateUrl: './set-page.html',
  styleUrl: './set-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetPage {
  protected readonly store = inject(SetStore);
  private readonly router = inject(Router);
  private readonly confirm = inject(Confirm);
  private readonly title = inject(PageTitle);
  private readonly id = toSignal(inject(ActivatedRoute).paramMap.pipe(map((params) => Number(params.get('id')))), {
    requireSync: true,
  });
  private readonly arrived = toSignal(this.router.events.pipe(filter((event) => event instanceof NavigationEnd)));

  protected readonly busy = signal(false);
  protected readonly trouble = signal('');
  protected readonly setName = setName;
  protected readonly inALine = inALine;
  protected readonly files = computed(() => {
    const estimate = this.store.newest();
    const sheet = addressOf(getAppraisalSheetPdf, { id: this.id() });
    const job = estimate && addressOf(getRestorationEstimatePdf, { id: estimate.id });
    return PAPER_SIZES.map((size) => ({
      name: PAPER_NAMES[size],
      sheet: `${sheet}?paper=${size}`,
      estimate: job === undefined ? null : `${job}?paper=${size}`,
    }));
  });
  protected readonly tabs = computed(() => {
    const set = this.store.set();
    return [
      { path: './', label: 'Overview', count: null, exact: true },
      { path: 'condition', label: 'Condition', count: null, exact: false },
      { path: 'worth', label: 'Worth', count: set?.worths.length ?? null, exact: false },
      { path: 'photos', label: 'Photos', count: set?.photos.length ?? null, exact: false },
    ];
  });

  constructor() {
    effect(() => this.store.open(this.id()));
    effect(() => {
      this.arrived(); // each tab's arrival writes the route's own title first
      const set = this.store.set();
      if (set) this.title.name(`${set.number} ${setName(set)}`);
    });
  }

  protected begin(): void {
    this.busy.set(true);
    this.store.beginEstimate('Restoration').subscribe({
      next: ({ id }) => void this.router.navigate(['/estimates', id]),
      error: (error: unknown) => this.fail(error),
    });
  }

  protected archive(archived: boolean): void {
    const question = archived
      ? {
          title: 'Archive this set?',
          text: 'It leaves the list of active sets. Nothing is deleted; its documents and estimates stay, and you can bring it back.',
          action: 'Archive',
        }
      : { title: 'Bring this set back?', text: 'It returns to the list of active sets.', action: 'Bring back' };
    this.confirm.ask(question).subscribe((yes) => {
      if (!yes) return;
      this.busy.set(true);
      this.store.archive(archived).subscribe({
        next: () => this.busy.set(false),
        error: (error: unknown) => this.fail(error),
      });
    });
  }

  private fail(error: unknown): void {
    this.busy.set(false);
    if (!(error instanceof ApiProblem)) throw error;
    this.trouble.set(error.message);
  }
}
