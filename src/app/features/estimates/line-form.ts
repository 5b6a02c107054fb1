import { FormControl, FormGroup, type AbstractControl, type ValidationErrors } from '@angular/forms';
import { lineContent, type LineContent } from '../../../contracts/estimates';
import type { LineKind, Stage } from '../../../domain/estimate/terms';

/** What is typed in a line's fields, as texts. Fields of other kinds stay empty. */
export interface TypedLine {
  readonly description: string;
  readonly stage: Stage;
  readonly low: string;
  readonly likely: string;
  readonly high: string;
  readonly rate: string;
  readonly quantity: string;
  readonly unitCost: string;
  readonly quote: string;
  readonly markupPercent: string;
}

export type LineForm = FormGroup<{ [Field in keyof TypedLine]: FormControl<TypedLine[Field]> }>;

/** What a new line of a kind begins with. */
export interface LineDefaults {
  readonly labourRate: string;
  readonly partsMarkupPercent: string;
  readonly outsideMarkupPercent: string;
}

export function emptyLine(kind: LineKind, stage: Stage, defaults: LineDefaults): TypedLine {
  const nothing = {
    description: '',
    stage,
    low: '',
    likely: '',
    high: '',
    rate: '',
    quantity: '',
    unitCost: '',
    quote: '',
  };
  switch (kind) {
    case 'labour':
      return { ...nothing, rate: defaults.labourRate, markupPercent: '' };
    case 'part':
      return { ...nothing, quantity: '1', markupPercent: defaults.partsMarkupPercent };
    case 'outside':
      return { ...nothing, markupPercent: defaults.outsideMarkupPercent };
  }
}

export function typedOf(content: LineContent): TypedLine {
  const { stage, description } = content;
  const nothing = { low: '', likely: '', high: '', rate: '', quantity: '', unitCost: '', quote: '', markupPercent: '' };
  switch (content.kind) {
    case 'labour':
      return { ...nothing, stage, description, ...content.hours, rate: content.rate };
    case 'part': {
      const { quantity, unitCost, markupPercent } = content;
      return { ...nothing, stage, description, quantity, unitCost, markupPercent };
    }
    case 'outside':
      return { ...nothing, stage, description, quote: content.quote, markupPercent: content.markupPercent };
  }
}

/**
 * The line that is typed. With one hours field filled and others left empty, the empty ones take the likely hours:
 * a known duration needs typing once.
 */
export function contentOf(kind: LineKind, typed: TypedLine): unknown {
  const { description, stage, low, likely, high, rate, quantity, unitCost, quote, markupPercent } = typed;
  switch (kind) {
    case 'labour':
      return { kind, stage, description, hours: { low: low || likely, likely, high: high || likely }, rate };
    case 'part':
      return { kind, stage, description, quantity, unitCost, markupPercent };
    case 'outside':
      return { kind, stage, description, quote, markupPercent };
  }
}

/** The typed line as the contract takes it, or null while something in it cannot be used. */
export function parsedLine(kind: LineKind, typed: TypedLine): LineContent | null {
  const parsed = lineContent.safeParse(contentOf(kind, typed));
  return parsed.success ? parsed.data : null;
}

/** A form over a line's fields, checked as a whole by the contract's schema; each issue lands on its field. */
export function makeLineForm(kind: LineKind, typed: TypedLine): LineForm {
  const control = <T>(value: T) => new FormControl(value, { nonNullable: true });
  const form: LineForm = new FormGroup({
    description: control(typed.description),
    stage: control(typed.stage),
    low: control(typed.low),
    likely: control(typed.likely),
    high: control(typed.high),
    rate: control(typed.rate),
    quantity: control(typed.quantity),
    unitCost: control(typed.unitCost),
    quote: control(typed.quote),
    markupPercent: control(typed.markupPercent),
  });
  for (const [name, field] of Object.entries(form.controls))
    field.addValidators((self: AbstractControl): ValidationErrors | null => {
      const message = issueOf(kind, { ...form.getRawValue(), [name]: self.value as string }, name);
      return message === null ? null : { zod: message };
    });
  form.updateValueAndValidity();
  for (const field of Object.values(form.controls)) field.updateValueAndValidity({ emitEvent: false });
  return form;
}

function issueOf(kind: LineKind, typed: TypedLine, field: string): string | null {
  const parsed = lineContent.safeParse(contentOf(kind, typed));
  if (parsed.success) return null;
  const issue = parsed.error.issues.find(({ path }) => path.at(-1) === field);
  if (issue === undefined) return null;
  return typed[field as keyof TypedLine] === '' ? 'This is needed.' : issue.message;
}
