import type { Owner } from '../../../src/contracts/owners';
import type { Authorized } from '../../db/authorized';
import type { OwnerRow, OwnersRepo } from './owners.repo';

export type OwnersService = ReturnType<typeof createOwnersService>;

export function createOwnersService(deps: {
  readonly repo: OwnersRepo;
  readonly now: () => number;
  /** The collector who signs in with an address, if any. */
  readonly findCollectorByEmail: (email: string) => number | null;
}) {
  const { repo, now, findCollectorByEmail } = deps;
  return {
    list(auth: Authorized<'owner.list'>): { items: Owner[]; total: number } {
      const items = repo.list(auth).map((row) => ({ ...shown(row), setCount: row.setCount }));
      return { items, total: items.length };
    },

    add(
      auth: Authorized<'owner.edit'>,
      input: { readonly name: string; readonly email: string; readonly phone: string },
    ): Owner {
      const userId = input.email === '' ? null : findCollectorByEmail(input.email);
      return { ...shown(repo.insert(auth, { ...input, userId, createdAt: now() })), setCount: 0 };
    },

    linkUser: (email: string, userId: number): void => repo.linkUser(email, userId),
  };
}

const shown = ({ id, name, email, phone, userId }: OwnerRow) => ({ id, name, email, phone, userId });
