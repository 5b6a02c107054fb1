/**
 * An estimate's sums and tax against published arithmetic. Sources: EN 16931 validation artefacts, ConnectingEurope/
 * eInvoicing-EN16931 (rules BR-CO-10 to 17 and UBL examples); Peppol BIS Billing 3 calculation examples; Streamlined
 * Sales and Use Tax Agreement s. 324; Idaho IDAPA 35.01.02.062. Row ids are those of the project's table of values.
 * Percentages on invoices there stand for one tax category here; allowances and charges are not part of an estimate.
 */
import { lineNet, marginOfMarkup, type Line } from '../../src/domain/estimate/line';
import { estimateTotals, percentOf, taxPerItem, type Terms } from '../../src/domain/estimate/totals';
import { centsToDecimal, toCents } from '../../src/domain/money/money';

const part = (quantity: string, unitCost: string): Line => ({
  kind: 'part',
  stage: 'signal',
  description: 'line',
  quantity,
  unitCost,
  markupPercent: '0',
});
const labour = (amount: string): Line => ({
  kind: 'labour',
  stage: 'signal',
  description: 'work',
  hours: { low: '1', likely: '1', high: '1' },
  rate: amount,
});
const terms = (taxRatePercent: string, taxTreatment: Terms['taxTreatment'] = 'both'): Terms => ({
  currency: 'EUR',
  taxTreatment,
  taxRatePercent,
  depositPercent: '0',
});
const invoice = (rate: string, ...lines: Line[]) => estimateTotals(lines, terms(rate)).likely;

describe('EN 16931: tax is on the category’s sum, rounded once (BR-CO-17)', () => {
  test('E-85 of Vat-category-S, one category: 10 × 400 and 10 × 90 at 25 %, base 4900 with charges left out', () => {
    expect(invoice('25', part('10', '400'), part('10', '90'))).toMatchObject({
      subtotal: '4900.00',
      taxable: '4900.00',
      tax: '1225.00',
      total: '6125.00',
    });
  });
  test('E-86 taxable base 4900 at 25 % gives 1225', () => {
    expect(percentOf('4900.00', '25')).toBe(122_500);
  });
  test('E-87 tc434-example1: 183.23 at 6 % and 46.37 at 21 % give 10.99 and 9.74', () => {
    expect([percentOf('183.23', '6'), percentOf('46.37', '21')]).toEqual([1099, 974]);
  });
  test('E-88 tc434-example2: 1460.50 at 25 % is 365.125, half away from zero 365.13', () => {
    expect(centsToDecimal(percentOf('1460.50', '25'))).toBe('365.13');
    expect(invoice('25', part('1', '1273.00'), part('1', '187.50'))).toMatchObject({
      taxable: '1460.50',
      tax: '365.13',
    });
  });
  test('E-91 tc434-example9: 3 × 49.00 at 21 %', () => {
    expect(invoice('21', part('3', '49.00'))).toMatchObject({ subtotal: '147.00', tax: '30.87', total: '177.87' });
  });
  test('E-93 .25 × 26935.78 at 19 %: 8013.40, not 8013.39', () => {
    expect(invoice('19', part('0.25', '26935.78'))).toMatchObject({
      subtotal: '6733.95',
      tax: '1279.45',
      total: '8013.40',
    });
  });
  test('E-94 three lines of 2 × 348.11 at 25 %: 522.17 by the category, 522.18 by the line', () => {
    const three = [part('2', '348.11'), part('2', '348.11'), part('2', '348.11')];
    expect(invoice('25', ...three).tax).toBe('522.17');
    expect(
      taxPerItem(
        three.map((line) => centsToDecimal(lineNet(line, 'likely'))),
        '25',
      ),
    ).toBe(52_218);
  });
  test('E-96 each category by itself: 3.46 at 13 % is .45, .06 at 24 % is .01', () => {
    expect([percentOf('3.46', '13'), percentOf('0.06', '24')]).toEqual([45, 1]);
  });
  test('E-81 a line’s net amount is rounded, and sums of lines are not rounded again', () => {
    expect(invoice('0', part('3', '0.335'), part('3', '0.335'))).toMatchObject({ subtotal: '2.02' }); // 1.005 → 1.01 twice
  });
  test('E-84 and E-92 a negative amount mirrors its positive: 1325 at 25 % is 331.25', () => {
    expect([percentOf('1325.00', '25'), percentOf('-1325.00', '25')]).toEqual([33_125, -33_125]);
  });
  test('E-97 half away from zero, where the standard leaves the direction open', () => {
    expect([toCents('0.025'), toCents('-0.025')]).toEqual([3, -3]);
  });
});

describe('US sales tax', () => {
  test('E-70 and E-71 Idaho: parts 25 + labour 40 at 6 %: 1.50 with labour stated apart, 3.90 lumped', () => {
    const job = [part('1', '25'), labour('40')];
    expect(estimateTotals(job, terms('6', 'parts')).likely.tax).toBe('1.50');
    expect(estimateTotals(job, terms('6', 'both')).likely.tax).toBe('3.90');
    expect(estimateTotals(job, terms('6', 'labour')).likely.tax).toBe('2.40');
    expect(estimateTotals(job, terms('6', 'none')).likely.tax).toBe('0.00');
  });
  test('E-76 and E-78 Streamlined Sales Tax s. 324: the third decimal above 4 rounds up', () => {
    expect([percentOf('.75', '6'), percentOf('2.25', '2')]).toEqual([5, 5]);
    expect(toCents('.0249999')).toBe(2);
  });
  test('E-77 3 × 1.99 at 7.25 %: .42 by the item, .43 by the invoice', () => {
    expect(taxPerItem(['1.99', '1.99', '1.99'], '7.25')).toBe(42);
    expect(invoice('7.25', part('3', '1.99')).tax).toBe('0.43');
  });
  test('E-79 7 × .33 at 6.5 %: .14 and .15; 3 × 10.10 at 7.25 %: 2.19 and 2.20', () => {
    expect([taxPerItem(Array<string>(7).fill('.33'), '6.5'), percentOf('2.31', '6.5')]).toEqual([14, 15]);
    expect([taxPerItem(Array<string>(3).fill('10.10'), '7.25'), percentOf('30.30', '7.25')]).toEqual([219, 220]);
  });
});

test('E-50 markup and margin are different things (brainscape, example-a.com)', () => {
  expect(['25', '33', '50', '100', '300'].map(marginOfMarkup)).toEqual(['20', '24.81', '33.33', '50', '75']);
});

test('E-51 cost 110 sold at 200 is a margin of 45 % (h-o-m-e.org)', () => {
  expect(marginOfMarkup('81.8182')).toBe('45');
});
