import { computed, inject, Injectable, signal } from '@angular/core';
import { concatMap, map, of, Subject, type Observable } from 'rxjs';
import type { EstimateDetail, EstimateLine, LineContent } from '../../../contracts/estimates';
import { estimateLine } from '../../../contracts/estimates';
import type { LineKind, Stage } from '../../../domain/estimate/terms';
import { ApiProblem } from '../../core/api-client';
import { EstimatesApi } from './estimates-api';
import { LineDrafts, type LineDraft } from './line-drafts';
import { emptyLine, typedOf, type TypedLine } from './line-form';

/** Why the open line is not saved, and what can be done about it. */
export type LineTrouble =
  | { readonly kind: 'changed'; readonly theirs: EstimateLine }
  | { readonly kind: 'removed' }
  | { readonly kind: 'refused'; readonly problem: ApiProblem };

interface Change {
  readonly send: () => Observable<EstimateDetail>;
  readonly done?: (() => void) | undefined;
  readonly failed: (problem: ApiProblem) => void;
}

/**
 * One estimate on the page. Changes go to the server one after the other, so that a person never conflicts with
 * themselves; the open line's typing is kept on this machine until the server has taken it.
 */
@Injectable()
export class EstimateStore {
  private readonly api = inject(EstimatesApi);
  private readonly drafts = inject(LineDrafts);
  private readonly changes = new Subject<Change>();

  private readonly current = signal<EstimateDetail | null>(null);
  private readonly loading = signal<ApiProblem | null>(null);
  private readonly open = signal<LineDraft | null>(null);
  private readonly waiting = signal(0);
  private readonly savedAt = signal<Date | null>(null);
  private readonly trouble = signal<LineTrouble | null>(null);
  private readonly restored = signal(false);
  private readonly lastProblem = signal<ApiProblem | null>(null);

  readonly estimate = this.current.asReadonly();
  readonly loadProblem = this.loading.asReadonly();
  /** The line that is open for typing. */
  readonly openLine = this.open.asReadonly();
  readonly lineTrouble = this.trouble.asReadonly();
  readonly saving = computed(() => this.waiting() > 0);
  readonly lastSavedAt = this.savedAt.asReadonly();
  /** Typing of an earlier visit that the server never took is back in the open line. */
  readonly draftRestored = this.restored.asReadonly();
  /** What went wrong with a change other than the open line's. */
  readonly problem = this.lastProblem.asReadonly();

  constructor() {
    this.changes.pipe(concatMap((change) => this.run(change))).subscribe();
  }

  load(id: number): void {
    this.loading.set(null);
    this.api.get(id).subscribe({
      next: (estimate) => {
        this.current.set(estimate);
        if (this.open() === null) this.restoreDraft(estimate);
      },
      error: (error: unknown) => this.loading.set(asProblem(error)),
    });
  }

  /** Takes what others saved meanwhile, unless something of ours is under way. */
  refresh(): void {
    const estimate = this.current();
    if (estimate === null || this.saving()) return;
    this.api.get(estimate.id).subscribe({
      next: (newer) => this.current.set(newer),
      error: (error: unknown) => this.lastProblem.set(asProblem(error)),
    });
  }

  edit(line: EstimateLine): void {
    const { content, id, version } = line;
    this.begin({ lineId: id, kind: content.kind, typed: typedOf(content), version });
  }

  beginLine(kind: LineKind, stage: Stage): void {
    const { defaults } = this.required();
    this.begin({ lineId: null, kind, typed: emptyLine(kind, stage, defaults), version: 0 });
  }

  /** Keeps every keystroke of the open line. */
  type(typed: TypedLine): void {
    const draft = this.open();
    if (draft === null) return;
    this.drafts.keep(this.required().id, { ...draft, typed });
  }

  /** Gives up the open line's typing. */
  closeLine(): void {
    this.open.set(null);
    this.trouble.set(null);
    this.restored.set(false);
    this.drafts.forget(this.required().id);
  }

  /** Saves the open line; it stays open, with what went wrong, until the server has taken it. */
  saveLine(content: LineContent, then?: () => void): void {
    const draft = this.open();
    if (draft === null) return;
    const { id } = this.required();
    const { lineId, version } = draft;
    this.trouble.set(null);
    this.queue({
      send: () => (lineId === null ? this.added(id, content) : this.api.updateLine(id, lineId, content, version)),
      done: () => {
        if (this.open() === draft) this.closeLine();
        then?.();
      },
      failed: (problem) => this.trouble.set(troubleOf(problem)),
    });
  }

  /** After «changed»: the typing now begins from their version, so saving puts it over theirs. */
  keepMine(content: LineContent, theirs: EstimateLine): void {
    this.open.update((draft) => draft && { ...draft, version: theirs.version });
    this.saveLine(content);
  }

  /** After «removed»: the typing becomes a line still to be added. */
  addMine(content: LineContent): void {
    this.open.update((draft) => draft && { ...draft, lineId: null, version: 0 });
    this.saveLine(content);
  }

  removeLine(line: EstimateLine, done: () => void): void {
    const { id } = this.required();
    this.send({ send: () => this.api.removeLine(id, line.id, line.version), done });
  }

  /** Puts a removed line back where it was. */
  restoreLine(content: LineContent, afterLineId: number | null, wasFirst: boolean): void {
    const { id } = this.required();
    this.send({
      send: () =>
        this.api
          .addLine(id, content, afterLineId)
          .pipe(concatMap(({ lineId, estimate }) => (wasFirst ? this.api.moveLine(id, lineId, null) : of(estimate)))),
    });
  }

  duplicateLine(line: EstimateLine): void {
    const { id } = this.required();
    this.send({ send: () => this.api.addLine(id, line.content, line.id).pipe(map(({ estimate }) => estimate)) });
  }

  moveLine(lineId: number, afterLineId: number | null, done?: () => void): void {
    const { id } = this.required();
    this.send({ send: () => this.api.moveLine(id, lineId, afterLineId), done });
  }

  archive(archived: boolean): void {
    const { id } = this.required();
    this.send({ send: () => this.api.archive(id, archived) });
  }

  /** Takes an answer that another part of the page fetched, such as the settings form's. */
  accept(estimate: EstimateDetail): void {
    this.current.set(estimate);
    this.savedAt.set(new Date());
  }

  dismissProblem(): void {
    this.lastProblem.set(null);
  }

  private begin(draft: LineDraft): void {
    this.trouble.set(null);
    this.open.set(draft);
  }

  private restoreDraft(estimate: EstimateDetail): void {
    const draft = this.drafts.read(estimate.id);
    if (draft === null) return;
    this.open.set(draft);
    this.restored.set(true);
    if (draft.lineId !== null && !estimate.lines.some(({ id }) => id === draft.lineId))
      this.trouble.set({ kind: 'removed' });
  }

  private added(id: number, content: LineContent): Observable<EstimateDetail> {
    const last = this.required().lines.findLast((line) => line.content.stage === content.stage);
    return this.api.addLine(id, content, last?.id ?? null).pipe(map(({ estimate }) => estimate));
  }

  private send(change: Omit<Change, 'failed'>): void {
    this.lastProblem.set(null);
    this.queue({
      ...change,
      failed: (problem) => {
        this.lastProblem.set(problem);
        this.refreshSoon(problem);
      },
    });
  }

  private queue(change: Change): void {
    this.waiting.update((n) => n + 1);
    this.changes.next(change);
  }

  /** A conflict means that the page is behind: show what stands now. */
  private refreshSoon({ code }: ApiProblem): void {
    if (code === 'edit-conflict' || code === 'not-found') setTimeout(() => this.refresh());
  }

  private async run({ send, done, failed }: Change): Promise<void> {
    await new Promise<void>((finish) => {
      send().subscribe({
        next: (estimate) => {
          this.accept(estimate);
          done?.();
        },
        error: (error: unknown) => {
          failed(asProblem(error));
          finish();
        },
        complete: finish,
      });
    });
    this.waiting.update((n) => n - 1);
  }

  private required(): EstimateDetail {
    const estimate = this.current();
    if (estimate === null) throw new Error('no estimate is loaded');
    return estimate;
  }
}

function asProblem(error: unknown): ApiProblem {
  if (error instanceof ApiProblem) return error;
  throw error;
}

function troubleOf(problem: ApiProblem): LineTrouble {
  if (problem.code === 'not-found') return { kind: 'removed' };
  const theirs = problem.code === 'edit-conflict' ? estimateLine.safeParse(problem.problem.current) : undefined;
  return theirs?.success === true ? { kind: 'changed', theirs: theirs.data } : { kind: 'refused', problem };
}
