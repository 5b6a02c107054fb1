import * as z from 'zod';

/** Every problem the server answers (RFC 9457): its code ends the `type`, its status and title are fixed. */
export const PROBLEMS = {
  'invalid-input': { status: 400, title: 'Some of what was sent cannot be used' },
  'not-signed-in': { status: 401, title: 'Sign in first' },
  'wrong-credentials': { status: 401, title: 'E-mail address or password is not right' },
  forbidden: { status: 403, title: 'Your role does not allow this' },
  'cross-site': { status: 403, title: 'The request came from another site' },
  'not-found': { status: 404, title: 'There is nothing here for you' },
  'edit-conflict': { status: 409, title: 'Somebody else has changed this since you opened it' },
  'already-exists': { status: 409, title: 'This exists already' },
  'not-allowed-now': { status: 409, title: 'This cannot be done in the present state' },
  'too-large': { status: 413, title: 'What was sent is too large' },
  'unusable-photo': { status: 422, title: 'The file is not a photograph that can be used' },
  'period-not-published': { status: 422, title: 'The index has no published figure for this period' },
  'too-many-attempts': { status: 429, title: 'Too many attempts' },
  'server-error': { status: 500, title: 'Something failed on our side' },
} as const;

export type ProblemCode = keyof typeof PROBLEMS;

/** One field that cannot be used: where, what was sent, and what would do. */
export const fieldProblem = z.object({ field: z.string(), value: z.string().optional(), message: z.string() });
export type FieldProblem = z.infer<typeof fieldProblem>;

export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string().optional(),
  fields: z.array(fieldProblem).optional(),
  requestId: z.string().optional(),
  /** With period-not-published: the nearest published periods. */
  neighbours: z.array(z.string()).optional(),
  /** With edit-conflict: the record as it stands now. */
  current: z.unknown().optional(),
});
export type Problem = z.infer<typeof problem>;

export const problemType = (code: ProblemCode) => `/problems/${code}`;
