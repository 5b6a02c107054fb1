import type { Practice } from '../../../contracts/practice';
import { TAX_TREATMENT_LABELS, type PaperSize } from '../../../domain/estimate/terms';

/** What the form holds: everything but the version, and the currency, which is fixed. */
export type Settings = Omit<Practice, 'version' | 'currency'>;
export type SettingName = keyof Settings;

export const SETTING_LABELS: Readonly<Record<SettingName, string>> = {
  name: 'Name',
  address: 'Address',
  phone: 'Telephone',
  email: 'E-mail',
  labourRate: 'Labour rate',
  partsMarkupPercent: 'Markup on parts',
  outsideMarkupPercent: 'Markup on outside work',
  taxTreatment: 'What is taxed',
  taxRatePercent: 'Tax rate',
  taxNote: 'Note beside the tax',
  depositPercent: 'Deposit',
  paperSize: 'Paper',
};
export const SETTING_NAMES = Object.keys(SETTING_LABELS) as SettingName[];

export const PAPER_LABELS: Readonly<Record<PaperSize, string>> = { letter: 'US Letter', a4: 'A4' };

export function settingsOf({ version: _version, currency: _currency, ...settings }: Practice): Settings {
  return settings;
}

export const sameSettings = (a: Settings, b: Settings): boolean => SETTING_NAMES.every((name) => a[name] === b[name]);

/** A setting as a person reads it. */
export function settingText(settings: Settings, name: SettingName): string {
  if (name === 'taxTreatment') return TAX_TREATMENT_LABELS[settings.taxTreatment];
  if (name === 'paperSize') return PAPER_LABELS[settings.paperSize];
  return settings[name] === '' ? 'nothing' : settings[name].replaceAll('\n', ', ');
}

/**
 * Two people changed the settings from the same beginning: `base`. What was not changed here is taken from `theirs`;
 * what was, stays, and `differing` names where both changed and disagree.
 */
export function mergeSettings(
  base: Settings,
  mine: Settings,
  theirs: Settings,
): { readonly merged: Settings; readonly differing: readonly SettingName[] } {
  const changedHere = SETTING_NAMES.filter((name) => mine[name] !== base[name]);
  const kept = Object.fromEntries(changedHere.map((name) => [name, mine[name]]));
  return {
    merged: { ...theirs, ...kept },
    differing: changedHere.filter((name) => theirs[name] !== base[name] && theirs[name] !== mine[name]),
  };
}
