import type { Request, Response, Router } from 'express';
import type * as z from 'zod';
import type { Contract, InputOf, ReplyOf } from '../../src/contracts/contract';
import type { Action } from '../../src/domain/access/policy';
import { authorize, type Actor, type Authorized } from '../db/authorized';
import { fieldProblems, ProblemError } from './problem';

type ActorOf<C extends Contract> = C['access'] extends 'public' ? Actor | null : Actor;

export interface RouteContext<C extends Contract> {
  readonly input: InputOf<C>;
  readonly actor: ActorOf<C>;
  /** Proof for the repos that the policy allows the contract's action. */
  readonly auth: C['access'] extends Action ? Authorized<C['access']> : undefined;
  readonly req: Request;
  readonly res: Response;
}

type Answer<C extends Contract> = C['reply'] extends 'binary' ? void : C['reply'] extends null ? void : ReplyOf<C>;

/**
 * Serves a contract: asks the access policy, parses params, query and body, hands them over, and sends the answer.
 * A `binary` contract's handler writes the response itself. With the app's setting «check replies» the answer must
 * fit the contract too.
 */
export function route<C extends Contract>(
  router: Router,
  contract: C,
  handler: (context: RouteContext<C>) => Promise<Answer<C>> | Answer<C>,
): void {
  const method = contract.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
  router[method](contract.path, async (req: Request, res: Response) => {
    const actor = (req.user as Actor | undefined) ?? null;
    if (contract.access !== 'public' && actor === null) throw new ProblemError('not-signed-in');
    const auth =
      actor !== null && contract.access !== 'public' && contract.access !== 'signed-in'
        ? authorize(actor, contract.access)
        : undefined;
    const input = {
      ...parsePart('params', contract.params, req.params),
      ...parsePart('query', contract.query, { ...(req.query as object) }),
      ...parsePart('body', contract.body, (req.body as unknown) ?? {}),
    };
    const reply: unknown = await handler({ input, actor, auth, req, res } as unknown as RouteContext<C>);
    if (contract.reply === 'binary') return;
    res.set('Cache-Control', res.get('Cache-Control') ?? 'no-store');
    if (contract.reply === null) {
      res.status(contract.status ?? 204).end();
      return;
    }
    if (req.app.get('check replies') === true) contract.reply.parse(reply);
    res.status(contract.status ?? 200).json(reply);
  });
}

function parsePart(part: string, schema: z.ZodType | undefined, value: unknown): Record<string, unknown> {
  if (schema === undefined) return {};
  const parsed = schema.safeParse(value);
  if (parsed.success) return { [part]: parsed.data };
  throw new ProblemError('invalid-input', { fields: fieldProblems(parsed.error, value) });
}
