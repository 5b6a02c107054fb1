import * as fc from 'fast-check';
import { foldText } from './fold';

test.each([
  ['Łukowska', 'lukowska'],
  ['ÉLODIE', 'elodie'],
  ['Ferrant & Oakes', 'ferrant & oakes'],
  ['Straße', 'strasse'],
  ['5-T 100%_', '5-t 100%_'],
])('%s is compared as %s', (text, folded) => expect(foldText(text)).toBe(folded));

test('folding twice changes nothing more', () => {
  fc.assert(fc.property(fc.string({ unit: 'grapheme' }), (text) => foldText(foldText(text)) === foldText(text)));
});
