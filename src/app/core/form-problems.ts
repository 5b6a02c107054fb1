import type { AbstractControl, FormGroup, ValidatorFn } from '@angular/forms';
import type * as z from 'zod';
import type { ApiProblem } from './api-client';

/** Validates a control by a contract's schema; the error's text is the schema's own. */
export const zodField =
  (schema: z.ZodType): ValidatorFn =>
  ({ value }) => {
    const parsed = schema.safeParse(value);
    return parsed.success ? null : { zod: messageOf(parsed.error, value) };
  };

/** A control that may be left empty, and else must fit the schema. */
export const optionalZodField = (schema: z.ZodType): ValidatorFn => {
  const validate = zodField(schema);
  return (control) => (control.value === '' || control.value === null ? null : validate(control));
};

function messageOf(error: z.ZodError, value: unknown): string {
  if (value === null || value === '') return 'This is needed.';
  return error.issues[0]?.message ?? 'This cannot be used.';
}

/** What is wrong with a control, in words; empty where nothing is. */
export function fieldError(control: AbstractControl | null | undefined): string {
  const errors: Record<string, unknown> = control?.errors ?? {};
  const text = errors['server'] ?? errors['zod'];
  if (typeof text === 'string') return text;
  return 'required' in errors ? 'This is needed.' : '';
}

/**
 * Puts the server's field errors on the form's controls (dotted paths), where they stay until the control changes.
 * Answers what belongs to no control, to be shown above the form; empty where every error found its field.
 */
export function showProblem(form: FormGroup, { problem, message }: ApiProblem): string {
  const fields = problem.fields ?? [];
  const homeless = fields.filter(({ field, message: text }) => {
    const control = form.get(field);
    control?.setErrors({ ...control.errors, server: text });
    control?.markAsTouched();
    return control === null;
  });
  if (fields.length === 0) return message;
  return homeless.map(({ field, message: text }) => `${field}: ${text}`).join(' ');
}
