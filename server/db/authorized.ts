import { scopeOf, type Action, type Role, type Scope } from '../../src/domain/access/policy';
import { ProblemError } from '../http/problem';

/** The person a request acts for. */
export interface Actor {
  readonly userId: number;
  readonly name: string;
  readonly role: Role;
}

declare const granted: unique symbol;

/**
 * Proof that the actor may do the action, and how far it reaches. Repos demand it, so that a query without a check
 * does not compile. Made by `authorize` alone.
 */
export interface Authorized<A extends Action = Action> {
  readonly actor: Actor;
  readonly action: A;
  readonly scope: Scope;
  readonly [granted]: true;
}

/** Asks the access policy; answers 403 when the role does not allow the action at all. */
export function authorize<A extends Action>(actor: Actor, action: A): Authorized<A> {
  const scope = scopeOf(actor.role, action);
  if (scope === null) throw new ProblemError('forbidden', { detail: `As ${actor.role} you cannot do this.` });
  return { actor, action, scope } as Authorized<A>;
}
