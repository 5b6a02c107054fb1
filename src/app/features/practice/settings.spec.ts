import { mergeSettings, sameSettings, settingText, type Settings } from './settings';
import { depositFigure, markupFigure, taxFigure } from './worked-figures';

const base: Settings = {
  name: 'Quayside Set Works',
  address: '3 Slipway Lane\nPort Ellery',
  phone: '',
  email: '',
  labourRate: '68.00',
  partsMarkupPercent: '35',
  outsideMarkupPercent: '15',
  taxTreatment: 'parts',
  taxRatePercent: '7.375',
  taxNote: '',
  depositPercent: '40',
  paperSize: 'letter',
};

describe('settings that two people changed', () => {
  it('keep what was typed here and take the rest from the other', () => {
    const { merged, differing } = mergeSettings(
      base,
      { ...base, labourRate: '72.00' },
      { ...base, phone: '(218) 555-0142' },
    );
    expect(merged).toEqual({ ...base, labourRate: '72.00', phone: '(218) 555-0142' });
    expect(differing).toEqual([]);
  });

  it('name what both changed to something else, and keep ours in the form', () => {
    const { merged, differing } = mergeSettings(
      base,
      { ...base, labourRate: '72.00', depositPercent: '50' },
      { ...base, labourRate: '70.00', depositPercent: '50' },
    );
    expect(differing).toEqual(['labourRate']);
    expect(merged.labourRate).toBe('72.00');
  });
});

describe('settings in words', () => {
  it('read as a person says them', () => {
    expect(settingText(base, 'taxTreatment')).toBe('Parts are taxed');
    expect(settingText(base, 'paperSize')).toBe('US Letter');
    expect(settingText(base, 'address')).toBe('3 Slipway Lane, Port Ellery');
    expect(settingText(base, 'phone')).toBe('nothing');
  });

  it('are the same only where every one is', () => {
    expect(sameSettings(base, { ...base })).toBe(true);
    expect(sameSettings(base, { ...base, taxNote: 'x' })).toBe(false);
  });
});

describe('worked figures', () => {
  it('tell a markup from a margin', () => {
    expect(markupFigure('50')).toBe(
      'A cost of $10.00 is billed at $15.00. Markup counts on the cost, margin on the price: this is a margin of 33.33 %.',
    );
  });

  it('tax what the treatment names, and only that', () => {
    expect(taxFigure('none', '7.375')).toContain('the tax is $0.00');
    expect(taxFigure('parts', '7.375')).toContain('the tax is $7.38');
    expect(taxFigure('labour', '7.375')).toContain('the tax is $22.13');
    expect(taxFigure('both', '7.375')).toContain('the tax is $29.50');
  });

  it('ask the deposit of a total', () => {
    expect(depositFigure('40')).toBe('On a total of $1,000.00, $400.00 is due before work starts.');
  });
});
