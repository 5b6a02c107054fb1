import type { BodyOf } from '../src/contracts/contract';
import type { addOwner } from '../src/contracts/owners';
import type { updatePractice } from '../src/contracts/practice';
import type { Role } from '../src/domain/access/policy';

/** Shown on the first start; these accounts exist in the demo practice alone. */
export const DEMO_PASSWORD = 'thenworth-demo';

export interface DemoAccount {
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}

export const DEMO_ACCOUNTS = [
  { name: 'Tess Aldworth', email: 'admin@quayside.example', role: 'administrator' },
  { name: 'Nell Harrow', email: 'restorer@quayside.example', role: 'restorer' },
  { name: 'Idris Bellweather', email: 'appraiser@quayside.example', role: 'appraiser' },
  { name: 'Wren Okafor', email: 'collector@quayside.example', role: 'collector' },
] as const satisfies readonly DemoAccount[];

/** Who records worths. */
export type AuthorKey = 'restorer' | 'appraiser';

export const SAID_BY: Readonly<Record<AuthorKey, string>> = {
  restorer: 'Nell Harrow, restorer, Quayside Set Works',
  appraiser: 'Idris Bellweather, appraiser, Port Ellery',
};

export const PRACTICE_NAME = 'Quayside Set Works';

/** The practice's settings but for its version. The town is invented; rates and tax are there to be changed. */
export const PRACTICE: Omit<BodyOf<typeof updatePractice>, 'version'> = {
  name: PRACTICE_NAME,
  address: '3 Slipway Lane\nPort Ellery, Minnesota',
  phone: '(218) 555-0142',
  email: 'bench@quayside.example',
  currency: 'USD',
  labourRate: '68.00',
  partsMarkupPercent: '35',
  outsideMarkupPercent: '15',
  taxTreatment: 'parts',
  taxRatePercent: '7.375',
  taxNote: 'Demo setting, not advice: check the rule and the rate of your state and city.',
  depositPercent: '40',
  paperSize: 'letter',
};

/** Owners of sets. The first is the demo collector: the same e-mail address joins the two. */
export const OWNERS = {
  okafor: { name: 'Wren Okafor', email: 'collector@quayside.example', phone: '(218) 555-0117' },
  tran: { name: 'Odile Tran', email: 'odile.tran@port-ellery.example', phone: '(218) 555-0128' },
  museum: { name: 'St. Brannoc Museum of Sound', email: 'registrar@stbrannoc.example', phone: '(218) 555-0160' },
  ferris: { name: 'Amadou Ferris', email: 'amadou@ferris.example', phone: '(218) 555-0133' },
  lund: { name: 'Priya Lund', email: 'priya.lund@port-ellery.example', phone: '' },
  merriden: { name: 'Joss Merriden', email: '', phone: '(218) 555-0171' },
  quist: { name: 'Hal Quist', email: 'hal@quist.example', phone: '(218) 555-0109' },
  valcourt: { name: 'Ines Valcourt', email: 'ines@valcourt.example', phone: '' },
  abernethy: { name: 'Ruth Abernethy-Sato', email: 'ruth.as@port-ellery.example', phone: '(218) 555-0184' },
  aas: { name: 'Benedikt Aas', email: 'benedikt@aas.example', phone: '' },
  pell: { name: 'Lorna Pell', email: '', phone: '(218) 555-0155' },
  workshop: { name: `${PRACTICE_NAME} (own stock)`, email: 'bench@quayside.example', phone: '(218) 555-0142' },
} as const satisfies Record<string, BodyOf<typeof addOwner>>;

export type OwnerKey = keyof typeof OWNERS;
