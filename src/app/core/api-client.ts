import { HttpClient, HttpErrorResponse, type HttpParams, HttpParams as Params } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import { catchError, throwError, type Observable } from 'rxjs';
import type { BodyOf, Contract, ReplyOf } from '../../contracts/contract';
import { problem as problemSchema, PROBLEMS, type Problem, type ProblemCode } from '../../contracts/problem';

type Value = string | number | boolean | null | undefined;

export type RequestOf<C extends Contract> = {
  readonly params?: Readonly<Record<string, string | number>>;
  /** Empty values are left out of the address. */
  readonly query?: Readonly<Record<string, Value>>;
} & (C['body'] extends NonNullable<Contract['body']> ? { readonly body: BodyOf<C> } : { readonly body?: undefined });

/** What the server refused, or that it could not be reached; `message` is fit to show. */
export class ApiProblem extends Error {
  constructor(
    readonly code: ProblemCode | 'unreachable',
    readonly problem: Problem,
  ) {
    super(problem.detail ?? problem.title);
  }
}

const UNREACHABLE: Problem = {
  type: '/problems/unreachable',
  title: 'The server does not answer',
  detail: 'The server does not answer. What you typed is still here; try again in a moment.',
  status: 0,
};

/** The address of a contract with its parameters filled in, such as `/api/sets/12`. */
export const addressOf = (contract: Contract, params: Readonly<Record<string, string | number>> = {}): string =>
  contract.path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(String(params[name] ?? '')));

/** Calls the server by its contracts; every failure arrives as an `ApiProblem`. */
@Injectable({ providedIn: 'root' })
export class ApiClient {
  private readonly http = inject(HttpClient);

  call<const C extends Contract>(contract: C, ...[request]: RequestArguments<C>): Observable<ReplyOf<C>> {
    const { params, query, body } = (request ?? {}) as RequestOf<Contract>;
    return this.http
      .request<ReplyOf<C>>(contract.method, addressOf(contract, params), { body, params: queryOf(query) })
      .pipe(catchError((error: unknown) => throwError(() => toApiProblem(error))));
  }
}

/** A request may be left out where nothing in it is needed. */
type RequestArguments<C extends Contract> =
  C['body'] extends NonNullable<Contract['body']> ? [request: RequestOf<C>] : [request?: RequestOf<C>];

function queryOf(query: Readonly<Record<string, Value>> = {}): HttpParams {
  const given = Object.entries(query).filter(([, value]) => value !== undefined && value !== null && value !== '');
  return new Params({ fromObject: Object.fromEntries(given.map(([name, value]) => [name, String(value)])) });
}

/** Any failure of a request as an `ApiProblem`; what is not a failure of a request is thrown on. */
export function toApiProblem(error: unknown): ApiProblem {
  if (error instanceof ApiProblem) return error;
  if (!(error instanceof HttpErrorResponse)) throw error;
  return problemOf(error.status, error.error);
}

/** The problem in an answer's body; an answer without one counts by its status. */
export function problemOf(status: number, body: unknown): ApiProblem {
  if (status === 0) return new ApiProblem('unreachable', UNREACHABLE);
  const parsed = problemSchema.safeParse(typeof body === 'string' ? parseJson(body) : body);
  const code = parsed.success ? parsed.data.type.split('/').at(-1) : undefined;
  if (parsed.success && code !== undefined && code in PROBLEMS) return new ApiProblem(code as ProblemCode, parsed.data);
  if (status === 502 || status === 503 || status === 504) return new ApiProblem('unreachable', UNREACHABLE);
  return new ApiProblem('server-error', {
    type: '/problems/server-error',
    title: PROBLEMS['server-error'].title,
    status,
  });
}

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null; // not ours: a proxy's own page, say
  }
}
