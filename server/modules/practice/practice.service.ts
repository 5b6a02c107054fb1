import type { Practice } from '../../../src/contracts/practice';
import { cents, centsToDecimal, toCents } from '../../../src/domain/money/money';
import { percentToPpm, ppmToPercent } from '../../../src/domain/money/scaled';
import type { Authorized } from '../../db/authorized';
import { ProblemError } from '../../http/problem';
import type { PracticeRepo, PracticeRow } from './practice.repo';

export type PracticeService = ReturnType<typeof createPracticeService>;

/**
 * What a new practice begins with; every figure is there to be changed. 75 an hour is one of the rates that shops
 * publish (common practice, no source); no tax, since that depends on the state.
 */
const BEGINNING = {
  currency: 'USD',
  labourRateCents: 7500,
  partsMarkupPpm: 300_000,
  outsideMarkupPpm: 100_000,
  taxTreatment: 'none',
  taxRatePpm: 0,
  depositPpm: 400_000,
  paperSize: 'letter',
} as const;

export function createPracticeService({ repo }: { readonly repo: PracticeRepo }) {
  /** The practice's settings, for whoever works on its behalf; null before it is set up. */
  function settings(): (Practice & { readonly demo: boolean }) | null {
    const row = repo.find();
    return row === undefined ? null : { ...shown(row), demo: row.demo };
  }

  function get(): Practice {
    const row = repo.find();
    if (row === undefined) throw new ProblemError('not-found', { detail: 'The practice is not set up yet.' });
    return shown(row);
  }

  return {
    settings,
    get: (_auth: Authorized<'practice.view'>): Practice => get(),

    /** Makes the practice's row with settings to begin with. */
    establish: ({ name, demo }: { readonly name: string; readonly demo: boolean }): void =>
      repo.insert({ id: 1, name, demo, ...BEGINNING }),

    update(auth: Authorized<'practice.edit'>, { version, ...input }: Practice): Practice {
      const { labourRate, partsMarkupPercent, outsideMarkupPercent, taxRatePercent, depositPercent, ...same } = input;
      const changed = repo.update(auth, version, {
        ...same,
        labourRateCents: toCents(labourRate),
        partsMarkupPpm: percentToPpm(partsMarkupPercent),
        outsideMarkupPpm: percentToPpm(outsideMarkupPercent),
        taxRatePpm: percentToPpm(taxRatePercent),
        depositPpm: percentToPpm(depositPercent),
      });
      if (!changed) throw new ProblemError('edit-conflict', { current: get() });
      return get();
    },
  };
}

function shown(row: PracticeRow): Practice {
  return {
    name: row.name,
    address: row.address,
    phone: row.phone,
    email: row.email,
    currency: 'USD',
    labourRate: centsToDecimal(cents(row.labourRateCents)),
    partsMarkupPercent: ppmToPercent(row.partsMarkupPpm),
    outsideMarkupPercent: ppmToPercent(row.outsideMarkupPpm),
    taxTreatment: row.taxTreatment,
    taxRatePercent: ppmToPercent(row.taxRatePpm),
    taxNote: row.taxNote,
    depositPercent: ppmToPercent(row.depositPpm),
    paperSize: row.paperSize,
    version: row.version,
  };
}
