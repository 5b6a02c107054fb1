import { SAMPLE } from '../../../tests/support/sample-series';
import type { Period } from '../calendar/period';
import { expectOk } from '../result';
import { averageYearlyRise, decadeMultipliers, purchasingPower } from './readings';

const rise = (factor: string, from: string, to: string) =>
  averageYearlyRise({ factor, from: { period: from as Period }, to: { period: to as Period } });

describe('the average yearly rise', () => {
  it('compounds between the middles of the periods', () => {
    expect(rise('1.21', '2000', '2002')).toEqual({ percent: '10.00', years: '2.0' });
    expect(rise('1.21', '2000-07', '2002-07')).toEqual({ percent: '10.00', years: '2.0' });
  });

  it('is a fall where prices fell, and the same looked at backwards', () => {
    expect(rise('0.81', '2000', '2002')).toEqual({ percent: '-10.00', years: '2.0' });
    expect(rise('0.8264462809917355371900826446', '2002', '2000')).toEqual({ percent: '10.00', years: '2.0' });
  });

  it('is none within one period', () => {
    expect(rise('1', '2000', '2000')).toBeNull();
  });
});

describe('other readings of the same sum', () => {
  it('one unit of the later money bought a part of one in the earlier', () => {
    expect(purchasingPower('22.37')).toBe('0.0447');
    expect(purchasingPower('1')).toBe('1.0000');
  });

  it('multiplies each decade’s first published year', () => {
    expect(decadeMultipliers(SAMPLE, '2026-05' as Period)).toEqual({
      ok: true,
      value: [{ period: '1940', multiplier: '23.9' }], // 335.123 ÷ 14.0
    });
    expect(expectOk(decadeMultipliers(SAMPLE, '1940' as Period))).toEqual([{ period: '1940', multiplier: '1.0' }]);
  });

  it('keeps two digits where prices were lower', () => {
    expect(expectOk(decadeMultipliers(SAMPLE, '1933' as Period))).toEqual([{ period: '1940', multiplier: '0.93' }]); // 13.0 ÷ 14.0
  });

  it('refuses a target without a figure', () => {
    expect(decadeMultipliers(SAMPLE, '2025-10' as Period)).toMatchObject({ ok: false, error: { which: 'to' } });
  });
});
