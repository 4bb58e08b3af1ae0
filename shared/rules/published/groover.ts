import { DEFAULT_SHOP_RULES } from '../../domain/shop-rules';
import { planDressing } from '../dressing';
import { stated } from '../figures';
import { infeedCaps } from '../infeed';
import { markFindings } from '../recommended-marks';
import { verdictOf } from '../verdict';
import { workRow } from '../work-table';
import { casesOf } from './case';

/** What is said of dressing this deep, everything else being usual. */
function dressing(depthMm: number) {
  const { findings } = planDressing({
    dress: {
      tipRadiusMm: null,
      diamondCarats: null,
      roughDepthMm: depthMm,
      roughPasses: null,
      roughOverlap: null,
      finishDepthMm: null,
      finishPasses: null,
      finishOverlap: null,
    },
    rules: DEFAULT_SHOP_RULES,
    diameterMm: 150,
    widthMm: 20,
    spindle: stated('spindle speed', [3000, 'rpm']),
    marking: null,
    dry: false,
    wheelMPerS: null,
  });
  return verdictOf(findings, []);
}

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
    {
      checks: 'Deepest dressing',
      inputs: '0.025 mm a pass',
      expected: 'clear',
      got: () => dressing(0.025),
    },
    {
      checks: 'Deeper than the deepest dressing',
      inputs: '0.03 mm a pass',
      note: 'US Army TC 9-524 allows 0.002 in; the stricter governs.',
      expected: 'check',
      got: () => dressing(0.03),
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
