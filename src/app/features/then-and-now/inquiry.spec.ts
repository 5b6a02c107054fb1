import { convertToParamMap } from '@angular/router';
import { inquiryFromAddress, isAnswerable, joinPeriod, splitPeriod } from './inquiry';

it('takes every part from the address, and defaults for what is missing', () => {
  expect(
    inquiryFromAddress(convertToParamMap({ amount: '39.95', from: '1938-05', to: '2021', series: 'us-cpi-u' })),
  ).toEqual({
    amount: '39.95',
    from: '1938-05',
    to: '2021',
    series: 'us-cpi-u',
  });
  expect(inquiryFromAddress(convertToParamMap({})).to).toBeNull();
});

it.each([
  [{}, true],
  [{ amount: '' }, false],
  [{ amount: '1,250' }, false],
  [{ amount: '-1' }, false],
  [{ from: '194' }, false],
  [{ from: '-05' }, false],
  [{ to: '' }, false],
  [{ to: null }, false],
  [{ to: '2026' }, true],
])('%p can be asked: %p', (part, answerable) => {
  const inquiry = { amount: '39.95', from: '1941', to: '2026-07', series: 'us-cpi-u', ...part };
  expect(isAnswerable(inquiry)).toBe(answerable);
});

it.each(['1941', '1941-05', '1948-Q3', '', '-05'])('splits and joins %p', (period) => {
  const { year, month } = splitPeriod(period);
  expect(joinPeriod(year, month)).toBe(period);
});
