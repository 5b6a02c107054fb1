import type { Services } from '../server/composition';
import { authorize, type Actor } from '../server/db/authorized';
import { DEMO_ACCOUNTS, DEMO_PASSWORD, OWNERS, PRACTICE, PRACTICE_NAME, type AuthorKey, type OwnerKey } from './people';

/** Who does what in the demo practice, and the ids of the owners. */
export interface OpenPractice {
  readonly staff: Readonly<Record<AuthorKey, Actor>>;
  readonly ownerIds: ReadonlyMap<OwnerKey, number>;
}

/** Opens the practice: its accounts, settings and owners. */
export async function openPractice({ accounts, practice, owners }: Services): Promise<OpenPractice> {
  const [first, restorerAccount, appraiserAccount, collectorAccount] = DEMO_ACCOUNTS;
  const password = DEMO_PASSWORD;
  const administrator = await accounts.setUp({ ...first, practiceName: PRACTICE_NAME, password, demo: true });
  const manage = authorize(administrator, 'user.manage');
  const restorer = await accounts.addActiveUser(manage, { ...restorerAccount, password });
  const appraiser = await accounts.addActiveUser(manage, { ...appraiserAccount, password });
  await accounts.addActiveUser(manage, { ...collectorAccount, password });

  const { version } = practice.get(authorize(administrator, 'practice.view'));
  practice.update(authorize(administrator, 'practice.edit'), { ...PRACTICE, version });

  const ownerIds = new Map(
    (Object.keys(OWNERS) as OwnerKey[]).map((key) => [
      key,
      owners.add(authorize(administrator, 'owner.edit'), OWNERS[key]).id,
    ]),
  );
  return { staff: { restorer, appraiser }, ownerIds };
}
