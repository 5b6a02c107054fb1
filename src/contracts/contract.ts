import type * as z from 'zod';
import type { Action } from '../domain/access/policy';
import type { ProblemCode } from './problem';

/** Who may call: anyone, anyone signed in, or those whom the access policy grants an action. */
export type Access = 'public' | 'signed-in' | Action;

/** What server and client agree on for one route. `reply: 'binary'` answers a file, `null` answers 204. */
export interface Contract {
  readonly method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** Express path, such as `/api/sets/:id`. */
  readonly path: string;
  readonly access: Access;
  readonly summary: string;
  readonly params?: z.ZodType;
  readonly query?: z.ZodType;
  readonly body?: z.ZodType;
  readonly reply: z.ZodType | 'binary' | null;
  /** Answer's status when all is well; 200, or 204 for an empty reply. */
  readonly status?: number;
  /** Problems special to this route, beside invalid-input, not-signed-in, forbidden and not-found. */
  readonly problems?: readonly ProblemCode[];
}

export const contract = <const C extends Contract>(definition: C): C => definition;

type Part<C extends Contract, K extends 'params' | 'query' | 'body'> = C[K] extends z.ZodType
  ? { readonly [P in K]: z.output<C[K]> }
  : unknown;

/** Parsed params, query and body of a contract's request. */
export type InputOf<C extends Contract> = Part<C, 'params'> & Part<C, 'query'> & Part<C, 'body'>;
/** What the client sends as body. */
export type BodyOf<C extends Contract> = C['body'] extends z.ZodType ? z.input<C['body']> : undefined;
/** What the route answers. */
export type ReplyOf<C extends Contract> = C['reply'] extends z.ZodType ? z.output<C['reply']> : undefined;
