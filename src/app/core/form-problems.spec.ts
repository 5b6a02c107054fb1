import { FormControl, FormGroup } from '@angular/forms';
import { moneyAmount, requiredText } from '../../contracts/common';
import { ApiProblem } from './api-client';
import { fieldError, optionalZodField, showProblem, zodField } from './form-problems';

const refusal = (fields?: { field: string; message: string }[]) =>
  new ApiProblem('invalid-input', {
    type: '/problems/invalid-input',
    title: 'Some of what was sent cannot be used',
    status: 400,
    ...(fields ? { fields } : {}),
  });

describe('fields checked by a contract', () => {
  it('says what would do', () => {
    const control = new FormControl('12,50', zodField(moneyAmount));
    expect(control.valid).toBe(false);
    expect(fieldError(control)).toBe(
      'Use a plain amount such as 39.95: at most 9 digits before the point and 2 after.',
    );
    control.setValue('12.50');
    expect(fieldError(control)).toBe('');
  });

  it('asks for what is empty instead of explaining its form', () => {
    expect(fieldError(new FormControl('', zodField(moneyAmount)))).toBe('This is needed.');
    expect(fieldError(new FormControl('  ', zodField(requiredText(10))))).toBe('This is needed.');
  });

  it('lets an optional field be empty', () => {
    const control = new FormControl('', optionalZodField(moneyAmount));
    expect(control.valid).toBe(true);
    control.setValue('x');
    expect(control.valid).toBe(false);
  });
});

describe('problems of the server', () => {
  const form = () =>
    new FormGroup({ email: new FormControl('a@b.example'), price: new FormGroup({ amount: new FormControl('1') }) });

  it('land on their fields, by dotted path, until the field changes', () => {
    const group = form();
    const said = showProblem(group, refusal([{ field: 'price.amount', message: 'Too dear.' }]));
    const amount = group.get('price.amount')!;
    expect(said).toBe('');
    expect(fieldError(amount)).toBe('Too dear.');
    expect(amount.touched).toBe(true);
    amount.setValue('2');
    expect(fieldError(amount)).toBe('');
    expect(group.valid).toBe(true);
  });

  it('are told above the form where they belong to no field', () => {
    expect(showProblem(form(), refusal([{ field: 'version', message: 'Use a whole number.' }]))).toBe(
      'version: Use a whole number.',
    );
    expect(showProblem(form(), refusal())).toBe('Some of what was sent cannot be used');
  });
});
