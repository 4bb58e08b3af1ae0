import { infeedCaps } from '../infeed';
import { markFindings } from '../recommended-marks';
import { workRow } from '../work-table';
import { casesOf } from './case';

export const groover = [
  ...casesOf('groover-24', [
    {
      checks: 'Low end of the usual infeed, where interrupted work starts',
      inputs: 'infeed 0.0075 to 0.075 mm outside',
      expected: 0.0075,
      unit: 'mm',
      tolerance: 'exact',
      got: () =>
        infeedCaps(workRow('plain-carbon-annealed'), {
          roughStockMm: null,
          interrupted: true,
          rules: { roughInfeedLimitMm: Infinity },
          burnMm: null,
          stepMm: 0.005,
        }).find(({ by }) => by === 'table')?.valueMm ?? null,
    },
  ]),
  ...casesOf('groover-24-diamond', [
    {
      checks: 'Diamond on steel',
      inputs: 'diamond wheel, hardened tool steel',
      expected: 'check',
      got: () => markFindings('D 126 C100 B', 'tool-hardened')[0]?.level ?? null,
    },
  ]),
];
