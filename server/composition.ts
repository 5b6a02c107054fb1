import type { OpenDatabase } from './db/client';
import { createAccountsRepo } from './modules/accounts/accounts.repo';
import { createAccountsService } from './modules/accounts/accounts.service';
import { createEstimatesRepo } from './modules/estimates/estimates.repo';
import { createEstimatesService } from './modules/estimates/estimates.service';
import { createOwnersRepo } from './modules/owners/owners.repo';
import { createOwnersService } from './modules/owners/owners.service';
import { createPapersService } from './modules/papers/papers.service';
import { createPracticeRepo } from './modules/practice/practice.repo';
import { createPracticeService } from './modules/practice/practice.service';
import { createRestatementsService } from './modules/restatements/restatements.service';
import { createPhotosRepo } from './modules/sets/photos.repo';
import { createSetsRepo } from './modules/sets/sets.repo';
import { createSetsService } from './modules/sets/sets.service';
import type { ReferenceData } from './reference-data/reference-data';

export type Services = ReturnType<typeof composeServices>;

/** Builds every service over one database; the one place that knows which module needs which. */
export function composeServices(deps: {
  readonly database: OpenDatabase;
  readonly referenceData: ReferenceData;
  /** Folder of the Lato TrueType files that PDFs embed. */
  readonly fontsFolder: string;
  /** Milliseconds since 1970. */
  readonly now: () => number;
}) {
  const { database, referenceData, fontsFolder, now } = deps;
  const { db } = database;
  const practice = createPracticeService({ repo: createPracticeRepo(db) });
  const restatements = createRestatementsService({ referenceData });
  const accountsRepo = createAccountsRepo(db);
  const owners = createOwnersService({
    repo: createOwnersRepo(db),
    now,
    findCollectorByEmail: (email) => accountsRepo.findCollectorByEmail(email),
  });
  const accounts = createAccountsService({ repo: accountsRepo, now, practice, owners });
  const sets = createSetsService({ repo: createSetsRepo(db), photos: createPhotosRepo(db), restatements, now });
  const estimates = createEstimatesService({ repo: createEstimatesRepo(db), sets, practice, now });
  const papers = createPapersService({ sets, estimates, practice, restatements, fontsFolder, now });
  return { accounts, practice, owners, sets, estimates, papers, restatements };
}
