import { textWidth } from '../year-scale/measures';
import { drawCostAgainstWorth } from './cost-against-worth';

const drawing = (asFound: number, asRestored: number) =>
  drawCostAgainstWorth(
    {
      currency: 'USD',
      asFound,
      asRestored,
      restoredLow: null,
      restoredHigh: null,
      cost: { low: 1300, likely: 1780, high: 2850 },
    },
    { width: 487, narrow: false, fontSize: 8 },
  );
const texts = (asFound: number, asRestored: number) => drawing(asFound, asRestored).labels.map(({ text }) => text);

it('the uplift stands over its bar where there is room, else behind the worth restored', () => {
  expect(texts(200, 2400)).toEqual(['$200 as found', '+$2,200', '$2,400 restored', 'likely $1,780']);
  expect(texts(60, 380)).toEqual(['$60 as found', '$380 restored, +$320', 'likely $1,780']);
});

it.each([
  [60, 380],
  [140, 950],
  [650, 2250],
  [2000, 300],
  [0, 0],
])('labels over the worth bar of %d to %d keep apart', (asFound, asRestored) => {
  const { labels } = drawing(asFound, asRestored);
  const [found, next] = labels;
  if (found === undefined || next?.y !== found.y) return;
  expect(found.x + textWidth(found.text, 8)).toBeLessThan(next.x - textWidth(next.text, 8));
});
