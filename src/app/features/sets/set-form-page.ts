import { ChangeDetectionStrategy, Component, computed, effect, inject, signal, viewChild } from '@angular/core';
import { rxResource, takeUntilDestroyed, toSignal } from '@angular/core/rxjs-interop';
import { MatIcon } from '@angular/material/icon';
import { ActivatedRoute, Router, RouterLink } from '@angular/router';
import { catchError, debounceTime, map, of, startWith, switchMap, type Observable } from 'rxjs';
import { moneyAmount, period } from '../../../contracts/common';
import type { SetDetail } from '../../../contracts/sets';
import { ApiProblem } from '../../core/api-client';
import { showProblem } from '../../core/form-problems';
import { PageTitle } from '../../core/page-title';
import type { HoldsUnsaved } from '../../core/unsaved';
import { Failed } from '../../ui/failed';
import { SkeletonRows } from '../../ui/skeleton-rows';
import { EditConflict } from './edit-conflict';
import type { NewOwner } from './owner-field';
import { previewText, type PricePreview } from './price-preview';
import { SetFormView } from './set-form';
import { bodyOf, fillForm, nameHazards, SetFormBuilder } from './set-form-model';
import { setName } from './set-words';
import { SetsApi } from './sets-api';

const TYPING_PAUSE_MS = 300;

/** Registers a set, or changes the one in the address. */
@Component({
  selector: 'tw-set-form-page',
  imports: [EditConflict, Failed, MatIcon, RouterLink, SetFormView, SkeletonRows],
  templateUrl: './set-form-page.html',
  host: { '(window:beforeunload)': 'beforeUnload($event)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetFormPage implements HoldsUnsaved {
  private readonly api = inject(SetsApi);
  private readonly router = inject(Router);
  private readonly title = inject(PageTitle);
  private readonly id = toSignal(
    inject(ActivatedRoute).paramMap.pipe(map((params) => (params.has('id') ? Number(params.get('id')) : null))),
    { requireSync: true },
  );

  protected readonly form = inject(SetFormBuilder).build();
  private readonly view = viewChild(SetFormView);

  protected readonly stored = rxResource({
    params: () => this.id() ?? undefined,
    stream: ({ params }) => this.api.get(params),
  });
  protected readonly owners = rxResource({ stream: () => this.api.owners() });
  protected readonly ownerChoices = computed(() => (this.owners.hasValue() ? this.owners.value() : []));
  protected readonly isNew = computed(() => this.id() === null);
  /** The record as it was when the form was filled from it. */
  private readonly base = signal<SetDetail | null>(null);
  protected readonly ready = computed(() => this.isNew() || this.base() !== null);
  protected readonly heading = computed(() => {
    const base = this.base();
    return base === null ? 'Register a set' : setName(base);
  });
  protected readonly crumb = computed(() => this.base()?.number ?? '');
  protected readonly back = computed(() => (this.isNew() ? '/sets' : `/sets/${this.id()}`));

  protected readonly saving = signal(false);
  protected readonly trouble = signal('');
  protected readonly ownerTrouble = signal('');
  protected readonly conflict = signal<{ readonly before: SetDetail; readonly now: SetDetail } | null>(null);
  private done = false;

  private readonly price = toSignal(
    this.form.controls.priceWhenNew.valueChanges.pipe(
      startWith(null),
      debounceTime(TYPING_PAUSE_MS),
      switchMap(() => this.preview()),
    ),
    { initialValue: null },
  );
  protected readonly previewText = computed(() => previewText(this.price()));

  constructor() {
    effect(() => {
      const set = this.stored.hasValue() ? this.stored.value() : undefined;
      if (set !== undefined) this.fill(set);
    });
    this.form.valueChanges.pipe(takeUntilDestroyed()).subscribe(() => this.trouble.set(''));
  }

  hasUnsaved(): boolean {
    return this.form.dirty && !this.done;
  }

  protected beforeUnload(event: BeforeUnloadEvent): void {
    if (this.hasUnsaved()) event.preventDefault();
  }

  protected save(): void {
    if (this.form.invalid) {
      this.form.markAllAsTouched();
      this.trouble.set('Some of this cannot be saved yet; see the marked fields.');
      this.view()?.showFirstError();
      return;
    }
    this.send(this.base()?.version ?? 0);
  }

  protected loadTheirs(): void {
    const conflict = this.conflict();
    if (conflict) this.fill(conflict.now);
  }

  protected saveOver(): void {
    const conflict = this.conflict();
    if (conflict) this.send(conflict.now.version);
  }

  protected addOwner(owner: NewOwner): void {
    this.ownerTrouble.set('');
    this.api.addOwner(owner).subscribe({
      next: (added) => {
        this.owners.update((all) => [...(all ?? []), added]);
        this.form.controls.ownerId.setValue(added.id);
        this.form.controls.ownerId.markAsDirty();
        this.view()?.ownerAdded();
      },
      error: (error: unknown) => {
        if (!(error instanceof ApiProblem)) throw error;
        const fields = error.problem.fields ?? [];
        this.ownerTrouble.set(fields.map(({ message }) => message).join(' ') || error.message);
      },
    });
  }

  private fill(set: SetDetail): void {
    fillForm(this.form, set);
    this.base.set(set);
    this.conflict.set(null);
    this.trouble.set('');
    this.title.name(`Edit ${set.number}`);
  }

  private send(version: number): void {
    const id = this.id();
    const body = bodyOf(this.form);
    this.saving.set(true);
    this.trouble.set('');
    const request = id === null ? this.api.register(body) : this.api.update(id, version, body);
    request.subscribe({
      next: (set) => {
        this.done = true;
        void this.router.navigate(['/sets', set.id]);
      },
      error: (error: unknown) => {
        this.saving.set(false);
        if (!(error instanceof ApiProblem)) throw error;
        const base = this.base();
        if (error.code === 'edit-conflict' && base !== null) {
          this.conflict.set({ before: base, now: error.problem.current as SetDetail });
          return;
        }
        const fields = nameHazards(error.problem.fields ?? [], body);
        this.trouble.set(
          showProblem(this.form, new ApiProblem(error.code, { ...error.problem, fields })) ||
            'Some of this cannot be saved yet; see the marked fields.',
        );
        this.view()?.showFirstError();
      },
    });
  }

  /** What the price typed comes to in the newest money; nothing until amount and period can be used. */
  private preview(): Observable<PricePreview> {
    const { amount, period: when } = this.form.controls.priceWhenNew.getRawValue();
    const usable = moneyAmount.safeParse(amount.trim()).success && period.safeParse(when.trim()).success;
    if (!usable) return of(null);
    return this.api.restate(amount.trim(), when.trim()).pipe(
      catchError((error: unknown) => {
        if (error instanceof ApiProblem) return of(error);
        throw error;
      }),
    );
  }
}
