import type { Period } from '../../src/domain/calendar/period';
import type { IndexSeries } from '../../src/domain/series/series';
import { openGretlData, readGretlVariable } from '../support/gretl';
import { cpi, cpi1967 } from '../support/published';

const gretl = openGretlData();

/** Every observation with both figures, as numbers: the packages do not keep trailing zeros. */
function compare(file: string, variable: string, series: IndexSeries) {
  if (!gretl.available) throw new Error(gretl.reason);
  const theirs = [...readGretlVariable(gretl.folder, file, variable)].filter(([, value]) => value !== 'NA');
  const shared = theirs.filter(([period]) => series.figures.has(period as Period));
  return {
    observations: theirs.length,
    shared: shared.length,
    different: shared.filter(([period, value]) => Number(series.figures.get(period as Period)) !== Number(value)),
    outside: theirs.filter(([period]) => !series.figures.has(period as Period)).map(([period]) => period),
  };
}

const same = (observations: number) => ({ observations, shared: observations, different: [], outside: [] });

describe('Debian’s gretl-data', () => {
  it('is at hand wherever the environment says CI', () => {
    if (process.env['CI']) expect(gretl).toMatchObject({ available: true });
  });
});

// Without apt there is nothing to compare with; the name then says so.
(gretl.available ? describe : describe.skip)(
  gretl.available ? 'figures in gretl-data equal ours' : `figures in gretl-data: skipped, ${gretl.reason}`,
  () => {
    it('PZUNEW, CPI-U all items not seasonally adjusted by month, 1973-01 to 1989-10', () => {
      // J. D. Hamilton, Time Series Analysis (1994), data of chapters 19 and 20
      expect(compare('misc/hamilton.gdt', 'PZUNEW', cpi)).toEqual(same(202));
    });

    it('cpi_u, the last month of each quarter on the base 1967=100, 1950 to 2000', () => {
      // W. H. Greene, Econometric Analysis, 5th edition (2003), table F5.1
      expect(compare('greene/greene5_1.gdt', 'cpi_u', cpi1967)).toEqual(same(204));
    });

    it('pcons, annual averages on the base 1967=100, 1913 to 1970', () => {
      // C. R. Nelson and C. I. Plosser (1982), from Historical Statistics of the United States; the years before 1913
      // are older estimates, which the Bureau of Labor Statistics' series does not hold
      const { different, shared, outside } = compare('misc/np.gdt', 'pcons', cpi1967);
      expect({ different, shared }).toEqual({ different: [], shared: 58 });
      expect([outside.at(0), outside.at(-1)]).toEqual(['1860', '1912']);
    });

    it('CPI, annual averages on the base 1982-84=100, 1950 to 2001', () => {
      // D. Epple and B. T. McCallum (2006), data on the market for broilers
      expect(compare('misc/broiler.gdt', 'CPI', cpi)).toEqual(same(52));
    });

    it('cpi, annual averages on the base 1982-84=100, 1959 to 1995', () => {
      // R. Ramanathan, from the Economic Report of the President 1996, table B-56
      expect(compare('ramanathan/data2-3.gdt', 'cpi', cpi)).toEqual(same(37));
    });
  },
);
