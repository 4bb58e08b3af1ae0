import { bendingOf } from '../quill';
import { sparkOutPasses, takePass } from '../spring';
import { casesOf } from './case';

/** What the last of some passes cuts when each is fed ten micrometres, µm. */
function cutOfPass(pass: number, fraction: number): number {
  let [springMm, cutMm] = [0, 0];
  for (let taken = 0; taken < pass; taken += 1)
    ({ springMm, cutMm } = takePass(0.01, springMm, fraction));
  return 1000 * cutMm;
}

const CUTS: readonly [pass: number, cut: number][] = [
  [1, 5],
  [2, 7.5],
  [3, 8.75],
  [4, 9.375],
  [5, 9.6875],
  [6, 9.84375],
];

const SPARK_OUTS: readonly [fraction: number, passes: number][] = [
  [0.5, 6],
  [0.7, 4],
];

const spring = casesOf('derived-spring', [
  ...CUTS.map(([pass, cut]) => ({
    checks: `What pass ${pass} really cuts`,
    inputs: 'cut fraction 0.5, each pass fed 10 µm',
    expected: cut,
    unit: 'µm',
    tolerance: 'exact' as const,
    got: () => cutOfPass(pass, 0.5),
  })),
  ...SPARK_OUTS.map(([fraction, passes]) => ({
    checks: 'Spark-out passes',
    inputs: `spring 20 µm down to 0.5 µm, cut fraction ${fraction}`,
    expected: passes,
    unit: 'passes',
    tolerance: 'exact' as const,
    got: () => sparkOutPasses(0.02, 0.0005, fraction),
  })),
]);

const beam = casesOf('derived-beam', [
  {
    checks: 'Bend of a stepped quill at the wheel',
    inputs: '30 mm of 10 mm, then 50 mm of 20 mm, E 206 000 N/mm², 100 N',
    expected: 0.0188926,
    unit: 'mm',
    tolerance: { within: 0.00000005 },
    got: () => {
      const segments = [
        { lengthMm: 30, diameterMm: 10 },
        { lengthMm: 50, diameterMm: 20 },
      ];
      const bent = bendingOf(segments, { modulus: 206_000, density: 7850 });
      return bent === null ? null : 100 * bent.deflectionMmPerN;
    },
  },
]);

export const firstPrinciplesSpring = [...spring, ...beam];
