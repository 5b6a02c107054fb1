import type { ErrorRequestHandler, Response } from 'express';
import type { Logger } from 'pino';
import type { ZodError } from 'zod';
import { PROBLEMS, problemType, type FieldProblem, type Problem, type ProblemCode } from '../../src/contracts/problem';

type Extra = Omit<Partial<Problem>, 'type' | 'title' | 'status' | 'requestId'>;

/** An expected refusal; answered as `application/problem+json` (RFC 9457). */
export class ProblemError extends Error {
  constructor(
    readonly code: ProblemCode,
    readonly extra: Extra = {},
  ) {
    super(extra.detail ?? PROBLEMS[code].title);
  }
}

/** One field that cannot be used, as a 400. */
export const fieldError = (field: string, message: string, value?: string) =>
  new ProblemError('invalid-input', { fields: [{ field, message, ...(value === undefined ? {} : { value }) }] });

export function sendProblem(res: Response, code: ProblemCode, extra: Extra = {}): void {
  const { status, title } = PROBLEMS[code];
  const body: Problem = { type: problemType(code), title, status, ...extra };
  res
    .status(status)
    .set('Cache-Control', 'no-store')
    .type('application/problem+json')
    .send(JSON.stringify({ ...body, requestId: requestIdOf(res) }));
}

function requestIdOf(res: Response): string {
  const { id } = res.req as { id?: unknown };
  return typeof id === 'string' ? id : '';
}

/** Each issue of a failed parse as a field, with what was sent there. */
export function fieldProblems(error: ZodError, input: unknown): FieldProblem[] {
  return error.issues.map((issue) => {
    const sent = issue.path.reduce<unknown>(
      (at, key) => (typeof at === 'object' && at !== null ? (at as Record<PropertyKey, unknown>)[key] : undefined),
      input,
    );
    const value = shown(sent);
    return {
      field: issue.path.map(String).join('.') || 'body',
      ...(value === undefined ? {} : { value }),
      message: sent === undefined && issue.code === 'invalid_type' ? 'This is needed.' : issue.message,
    };
  });
}

/** What was sent, shortened; nothing for what was not sent. */
function shown(sent: unknown): string | undefined {
  if (sent === undefined) return undefined;
  const text = typeof sent === 'string' ? sent : JSON.stringify(sent);
  return text.length > 80 ? `${text.slice(0, 80)}…` : text;
}

interface HttpError {
  readonly status?: number;
  readonly type?: string;
  readonly code?: string;
}

/** The last handler: expected refusals as they are, the parsers' refusals as 4xx, the rest as 500 with the id only. */
export function problemHandler(log: Logger): ErrorRequestHandler {
  return (error: unknown, _req, res, next) => {
    if (res.headersSent) {
      next(error);
      return;
    }
    if (error instanceof ProblemError) {
      sendProblem(res, error.code, error.extra);
      return;
    }
    const { status, type, code } = error as HttpError;
    if (status === 413 || code === 'LIMIT_FILE_SIZE') sendProblem(res, 'too-large');
    else if (typeof code === 'string' && code.startsWith('LIMIT_'))
      sendProblem(res, 'invalid-input', { fields: [{ field: 'photo', message: 'Send one file in the field photo.' }] });
    else if (type === 'entity.parse.failed')
      sendProblem(res, 'invalid-input', { fields: [{ field: 'body', message: 'This is not valid JSON.' }] });
    else if (typeof status === 'number' && status >= 400 && status < 500)
      sendProblem(res, 'invalid-input', { detail: 'The request could not be read.' });
    else {
      log.error({ err: error, requestId: requestIdOf(res) }, 'request failed');
      sendProblem(res, 'server-error');
    }
  };
}
