import * as estimates from '../../src/contracts/estimates';
import * as health from '../../src/contracts/health';
import * as owners from '../../src/contracts/owners';
import * as papers from '../../src/contracts/papers';
import * as practice from '../../src/contracts/practice';
import * as restatements from '../../src/contracts/restatements';
import * as series from '../../src/contracts/series';
import * as sessions from '../../src/contracts/session';
import * as sets from '../../src/contracts/sets';
import * as users from '../../src/contracts/users';
import type { Contract } from '../../src/contracts/contract';

const modules = { estimates, health, owners, papers, practice, restatements, series, sessions, sets, users };
export const CONTRACT_FILES = Object.keys(modules).length;

const isContract = (value: unknown): value is Contract =>
  typeof value === 'object' && value !== null && 'method' in value && 'path' in value && 'access' in value;

/** Every contract of `src/contracts`. */
export const CONTRACTS: readonly Contract[] = Object.values(modules).flatMap((m) =>
  Object.values(m as object).filter(isContract),
);
