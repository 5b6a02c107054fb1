import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  signal,
  untracked,
  viewChild,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatMenu, MatMenuItem, MatMenuTrigger } from '@angular/material/menu';
import { MatSnackBar } from '@angular/material/snack-bar';
import { RouterLink } from '@angular/router';
import type { EstimateDetail, EstimateLine } from '../../../contracts/estimates';
import { formatMoney } from '../../../domain/money/money';
import { PageTitle } from '../../core/page-title';
import { SessionStore } from '../../core/session';
import type { HoldsUnsaved } from '../../core/unsaved';
import { Confirm } from '../../ui/confirm';
import { Failed } from '../../ui/failed';
import { HazardPanel } from '../../ui/hazard-panel';
import { Notice } from '../../ui/notice';
import { StatusChip } from '../../ui/status-chip';
import { Sweep } from '../../ui/sweep';
import { EstimateLines } from './estimate-lines';
import { EstimateSettings } from './estimate-settings';
import { EstimateStore } from './estimate-store';
import { EstimateSums } from './estimate-sums';

/** One estimate: its lines, what they come to, and that against the worth. */
@Component({
  selector: 'tw-estimate-page',
  imports: [
    EstimateLines,
    EstimateSettings,
    EstimateSums,
    Failed,
    HazardPanel,
    MatButton,
    MatIcon,
    MatMenu,
    MatMenuItem,
    MatMenuTrigger,
    Notice,
    RouterLink,
    StatusChip,
    Sweep,
  ],
  providers: [EstimateStore],
  templateUrl: './estimate-page.html',
  styleUrl: './estimate-page.scss',
  host: { '(window:focus)': 'comeBack()', '(window:beforeunload)': 'beforeUnload($event)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EstimatePage implements HoldsUnsaved {
  readonly id = input.required<string>();

  private readonly session = inject(SessionStore);
  private readonly confirm = inject(Confirm);
  private readonly snackBar = inject(MatSnackBar);
  private readonly title = inject(PageTitle);
  protected readonly store = inject(EstimateStore);
  private readonly settings = viewChild(EstimateSettings);
  protected readonly changingSettings = signal(false);
  protected readonly formatMoney = formatMoney;

  protected readonly editable = computed(
    () => this.session.can('estimate.edit') && this.store.estimate()?.archived === false,
  );
  protected readonly mayArchive = computed(() => this.session.can('estimate.edit'));
  protected readonly savedText = computed(() => {
    if (this.store.saving()) return 'Saving …';
    const at = this.store.lastSavedAt();
    return at === null ? '' : `Saved at ${at.toLocaleTimeString([], { hour: '2-digit', minute: '2-digit' })}`;
  });

  constructor() {
    effect(() => {
      const id = Number(this.id());
      untracked(() => this.store.load(id));
    });
    effect(() => {
      const estimate = this.store.estimate();
      if (estimate !== null) this.title.name(`Estimate ${estimate.number}`);
    });
  }

  /** The open line is kept on this machine; only typed settings would be lost. */
  hasUnsaved(): boolean {
    return this.store.saving() || (this.settings()?.dirty ?? false);
  }

  protected retry(): void {
    this.store.load(Number(this.id()));
  }

  protected setName({ set }: EstimateDetail): string {
    return `${set.maker} ${set.model}`;
  }

  protected comeBack(): void {
    if (this.store.openLine() === null) this.store.refresh();
  }

  protected beforeUnload(event: BeforeUnloadEvent): void {
    if (this.hasUnsaved()) event.preventDefault();
  }

  protected settingsSaved(estimate: EstimateDetail): void {
    this.store.accept(estimate);
    this.changingSettings.set(false);
  }

  protected offerUndo(event: {
    readonly line: EstimateLine;
    readonly afterLineId: number | null;
    readonly wasFirst: boolean;
  }): void {
    this.snackBar
      .open(`Removed «${event.line.content.description}»`, 'Undo', { duration: 10_000 })
      .onAction()
      .subscribe(() => this.store.restoreLine(event.line.content, event.afterLineId, event.wasFirst));
  }

  protected archive(archived: boolean): void {
    if (!archived) {
      this.store.archive(false);
      return;
    }
    this.confirm
      .ask({
        title: 'Archive this estimate?',
        text: 'It leaves the list and can no longer be changed. Nothing is deleted: it can be brought back.',
        action: 'Archive',
      })
      .subscribe((yes) => {
        if (yes) this.store.archive(true);
      });
  }
}
