import { computed, inject, Injectable, linkedSignal, signal } from '@angular/core';
import { rxResource, toObservable, toSignal } from '@angular/core/rxjs-interop';
import { catchError, debounceTime, map, of, switchMap } from 'rxjs';
import type { Period } from '../../../domain/calendar/period';
import { parsePlainDecimal } from '../../../domain/money/money';
import { describeNotPublished } from '../../../domain/restatement/not-published';
import { decadeMultipliers } from '../../../domain/restatement/readings';
import { restate, restatedCurve } from '../../../domain/restatement/restate';
import { annualAverages, newestPeriod } from '../../../domain/series/figures';
import type { YearScaleContent } from '../../../domain/year-scale/content';
import { needleStops } from '../../../domain/year-scale/stops';
import { ApiProblem } from '../../core/api-client';
import { FIRST_INQUIRY, inquiryKey, isAnswerable, type AnswerableInquiry, type Inquiry } from './inquiry';
import type { RefusedPeriod } from './refusal';
import { formatFactor, fromReply, type ShownRestatement } from './shown-restatement';
import { ThenAndNowApi } from './then-and-now-api';

/** What the server said to a request, or that it could not be asked. */
type Reply =
  | { readonly kind: 'shown'; readonly request: Inquiry; readonly shown: ShownRestatement }
  | { readonly kind: 'refused'; readonly request: Inquiry; readonly refused: RefusedPeriod }
  | { readonly kind: 'failed'; readonly request: Inquiry; readonly problem: ApiProblem };

type Answer =
  | { readonly kind: 'shown'; readonly shown: ShownRestatement }
  | { readonly kind: 'refused'; readonly refused: RefusedPeriod }
  | { readonly kind: 'none' };

const TYPING_PAUSE_MS = 250;

/**
 * The page's state: what is asked, and what that comes to. The answer is the server's; until it arrives, and where the
 * server cannot be reached, the same domain function works it out from the figures loaded before.
 */
@Injectable()
export class RestatementStore {
  private readonly api = inject(ThenAndNowApi);
  private readonly asked = signal<Inquiry>(FIRST_INQUIRY);
  private readonly attempt = signal(0);

  readonly seriesList = rxResource({ stream: () => this.api.series() });
  readonly series = computed(() => {
    const list = this.seriesList.hasValue() ? this.seriesList.value() : [];
    return list.find(({ id }) => id === this.asked().series) ?? list.at(0);
  });
  readonly figures = rxResource({
    params: () => this.series(),
    stream: ({ params }) => this.api.figures(params),
  });
  private readonly index = computed(() => (this.figures.hasValue() ? this.figures.value() : undefined));
  readonly knownPrices = rxResource({ stream: () => this.api.knownPrices() });

  /** What is asked, with the defaults filled in: the series in force, and its newest month. */
  readonly inquiry = computed<Inquiry>(() => {
    const asked = this.asked();
    const series = this.series();
    return { ...asked, series: series?.id ?? asked.series, to: asked.to ?? series?.last ?? null };
  });

  private readonly request = computed<AnswerableInquiry | null>(
    () => {
      const inquiry = this.inquiry();
      return isAnswerable(inquiry) ? inquiry : null;
    },
    { equal: (a, b) => (a === null || b === null ? a === b : inquiryKey(a) === inquiryKey(b)) },
  );

  private readonly reply = toSignal(
    toObservable(computed(() => ({ request: this.request(), attempt: this.attempt() }))).pipe(
      debounceTime(TYPING_PAUSE_MS),
      switchMap(({ request }) => (request === null ? of(null) : this.ask(request))),
    ),
    { initialValue: null },
  );

  /** The reply to what is asked at present, not to what was asked before. */
  private readonly currentReply = computed(() => {
    const reply = this.reply();
    return reply && reply.request === this.request() ? reply : null;
  });

  readonly answer = computed<Answer>(() => {
    const request = this.request();
    if (request === null) return { kind: 'none' };
    const reply = this.currentReply();
    return reply === null || reply.kind === 'failed' ? this.preview(request) : reply;
  });

  /** The last answer that had an amount; stays while another is refused or awaited. */
  readonly shown = linkedSignal<Answer, ShownRestatement | null>({
    source: this.answer,
    computation: (answer, previous) => (answer.kind === 'shown' ? answer.shown : (previous?.value ?? null)),
  });

  readonly refused = computed(() => {
    const answer = this.answer();
    return answer.kind === 'refused' ? answer.refused : null;
  });

  /** Why the server has not answered what is asked; null when it has, or is about to. */
  readonly problem = computed(() => {
    const reply = this.currentReply();
    return reply?.kind === 'failed' ? reply.problem : null;
  });

  /** True while there is nothing to show yet and an answer is on its way. */
  readonly awaited = computed(
    () => this.shown() === null && this.request() !== null && this.refused() === null && this.problem() === null,
  );

  /** The index with all its figures, once loaded, if it is the one shown. */
  readonly shownIndex = computed(() => {
    const index = this.index();
    return index?.id === this.shown()?.series ? index : undefined;
  });

  readonly stops = computed<readonly Period[]>(() => {
    const index = this.shownIndex();
    return index
      ? needleStops(
          annualAverages(index).map(({ period }) => period),
          newestPeriod(index),
        )
      : [];
  });

  readonly scale = computed<YearScaleContent | null>(() => {
    const shown = this.shown();
    const series = this.series();
    if (shown === null || series === undefined) return null;
    const index = this.shownIndex();
    const price = parsePlainDecimal(shown.original);
    const curve = index && price.ok ? restatedCurve(index, price.value, shown.from.period) : null;
    const multipliers = index ? decadeMultipliers(index, shown.to.period) : null;
    return {
      first: series.first as Period,
      last: series.last as Period,
      from: shown.from.period,
      to: shown.to.period,
      price: shown.original,
      restated: shown.restated,
      currency: shown.currency,
      factor: formatFactor(shown.factor).replace('× ', ''),
      curve: curve?.ok ? curve.value : [],
      ...(multipliers?.ok ? { multipliers: multipliers.value } : {}),
    };
  });

  set(inquiry: Inquiry): void {
    this.asked.set(inquiry);
  }

  /** Asks again for whatever could not be had. */
  retry(): void {
    if (this.seriesList.error()) this.seriesList.reload();
    if (this.figures.error()) this.figures.reload();
    if (this.knownPrices.error()) this.knownPrices.reload();
    this.attempt.update((count) => count + 1);
  }

  private ask(request: AnswerableInquiry) {
    return this.api.restate(request).pipe(
      map((reply): Reply => ({ kind: 'shown', request, shown: fromReply(reply) })),
      catchError((error: unknown) => {
        if (!(error instanceof ApiProblem)) throw error;
        return of(replyOfProblem(request, error));
      }),
    );
  }

  private preview(request: AnswerableInquiry): Answer {
    const index = this.index();
    const price = parsePlainDecimal(request.amount);
    if (index === undefined || index.id !== request.series || !price.ok) return { kind: 'none' };
    const result = restate({
      series: index,
      amount: price.value,
      from: request.from as Period,
      to: request.to as Period,
    });
    if (result.ok) {
      const { id, release, currency } = index;
      return { kind: 'shown', shown: { ...result.value, series: id, release, currency } };
    }
    const { which, neighbours } = result.error;
    return { kind: 'refused', refused: { which, neighbours, detail: describeNotPublished(result.error) } };
  }
}

function replyOfProblem(request: Inquiry, error: ApiProblem): Reply {
  if (error.code !== 'period-not-published') return { kind: 'failed', request, problem: error };
  const { detail, title, neighbours, fields } = error.problem;
  const refused: RefusedPeriod = {
    which: fields?.[0]?.field === 'to' ? 'to' : 'from',
    detail: detail ?? title,
    neighbours: (neighbours ?? []) as Period[],
  };
  return { kind: 'refused', request, refused };
}
