import { inject, Injectable } from '@angular/core';
import { NonNullableFormBuilder, type AbstractControl, type ValidatorFn } from '@angular/forms';
import * as z from 'zod';
import { currency, moneyAmount, period } from '../../../contracts/common';
import type { FieldProblem } from '../../../contracts/problem';
import { hazardEntry, priceWhenNew, registerSet, type SetDetail } from '../../../contracts/sets';
import { HAZARDS, type Hazard } from '../../../domain/sets/hazards';
import type { SetKind } from '../../../domain/sets/terms';
import { zodField } from '../../core/form-problems';
import type { SetBody } from './sets-api';

const identity = registerSet.body.shape;

/** A whole number as typed; empty is none. */
const typedNumber = (schema: z.ZodType<number | null, number | null>, advice: string) =>
  z
    .string()
    .trim()
    .regex(/^\d*$/, advice)
    .transform((text) => (text === '' ? null : Number(text)))
    .pipe(schema);
const typedYear = typedNumber(identity.year, 'Use a year such as 1941.');
const typedVolts = typedNumber(hazardEntry.shape.volts, 'Use whole volts such as 385.');

/** Amount, period and source of a price belong together: one given, all are needed. */
const neededTogether =
  (schema: z.ZodType): ValidatorFn =>
  (control) =>
    isEmptyGroup(control.parent) ? null : zodField(schema)(control);

const isEmptyGroup = (group: AbstractControl | null): boolean =>
  Object.values((group?.value ?? {}) as Record<string, string>).every((text) => text.trim() === '');

export type SetForm = ReturnType<SetFormBuilder['build']>;

@Injectable({ providedIn: 'root' })
export class SetFormBuilder {
  private readonly fb = inject(NonNullableFormBuilder);

  /** An empty form; its controls are named as the contract names them, the hazards each by its own name. */
  build() {
    const { fb } = this;
    const hazard = () =>
      fb.group({ on: [false], volts: ['', zodField(typedVolts)], note: ['', zodField(identity.notes)] });
    const hazards = Object.fromEntries(HAZARDS.map((name) => [name, hazard()])) as Record<
      Hazard,
      ReturnType<typeof hazard>
    >;
    return fb.group({
      kind: ['' as SetKind | '', zodField(identity.kind)],
      maker: ['', zodField(identity.maker)],
      model: ['', zodField(identity.model)],
      description: ['', zodField(identity.description)],
      chassis: ['', zodField(identity.chassis)],
      serial: ['', zodField(identity.serial)],
      year: ['', zodField(typedYear)],
      ownerId: fb.control<number | null>(null),
      priceWhenNew: fb.group({
        amount: ['', neededTogether(moneyAmount)],
        period: ['', neededTogether(period)],
        source: ['', neededTogether(priceWhenNew.shape.source)],
      }),
      priceIsPublic: [false],
      provenance: ['', zodField(identity.provenance)],
      alterations: ['', zodField(identity.alterations)],
      notes: ['', zodField(identity.notes)],
      hazards: fb.group(hazards),
    });
  }
}

/** Asks each part of the price again when another has changed. */
export function checkTogether({ controls }: SetForm): void {
  for (const part of Object.values(controls.priceWhenNew.controls)) part.updateValueAndValidity({ emitEvent: false });
}

/** Fills the form with a set on record. */
export function fillForm(form: SetForm, set: SetDetail): void {
  const { kind, maker, model, description, chassis, serial, ownerId, priceIsPublic } = set;
  const { provenance, alterations, notes } = set;
  form.reset({
    ...{ kind, maker, model, description, chassis, serial, ownerId, priceIsPublic, provenance, alterations, notes },
    year: set.year === null ? '' : String(set.year),
    priceWhenNew: {
      amount: set.priceWhenNew?.amount ?? '',
      period: set.priceWhenNew?.period ?? '',
      source: set.priceWhenNew?.source ?? '',
    },
    hazards: Object.fromEntries(
      set.hazards.map(({ hazard, volts, note }) => [
        hazard,
        { on: true, volts: volts === null ? '' : String(volts), note },
      ]),
    ),
  });
  checkTogether(form);
}

/** The form as the contract's body. Call it on a valid form. */
export function bodyOf(form: SetForm): SetBody {
  const { kind, year, priceWhenNew: price, hazards, ...same } = form.getRawValue();
  return {
    ...same,
    kind: identity.kind.parse(kind),
    year: typedYear.parse(year),
    priceWhenNew: isEmptyGroup(form.controls.priceWhenNew)
      ? null
      : { ...trimmed(price), currency: currency.parse('USD') },
    hazards: chosen(hazards).map((hazard) => ({
      hazard,
      volts: typedVolts.parse(hazards[hazard].volts),
      note: hazards[hazard].note,
    })),
  };
}

const trimmed = ({ amount, period: when, source }: { amount: string; period: string; source: string }) => ({
  amount: amount.trim(),
  period: when.trim(),
  source: source.trim(),
});

const chosen = (hazards: Readonly<Record<Hazard, { readonly on: boolean }>>): Hazard[] =>
  HAZARDS.filter((hazard) => hazards[hazard].on);

/** The server counts the hazards sent (`hazards.0.volts`); the form names them (`hazards.asbestos.volts`). */
export function nameHazards(fields: readonly FieldProblem[], { hazards }: SetBody): FieldProblem[] {
  return fields.map((entry) => ({
    ...entry,
    field: entry.field.replace(/^hazards\.(\d+)/, (all, at: string) => {
      const hazard = hazards[Number(at)]?.hazard;
      return hazard === undefined ? all : `hazards.${hazard}`;
    }),
  }));
}
