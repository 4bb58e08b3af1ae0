import { markingOf } from '../bond';
import type { ConventionalMarking } from '../marking';
import { casesOf } from './case';

function part<Key extends keyof ConventionalMarking>(key: Key): ConventionalMarking[Key] | null {
  const marking = markingOf('A 60 K 8 V');
  return marking?.kind === 'conventional' ? marking[key] : null;
}

const reads = (mark: string) => (markingOf(mark) === null ? 'refused' : 'read');
const inputs = 'A 60 K 8 V';

const RANGES: readonly [checks: string, mark: string, answer: string][] = [
  ['Coarsest grain', 'A F4 K 8 V', 'read'],
  ['Finest grain', 'A F1200 K 8 V', 'read'],
  ['Softest grade', 'A 60 A 8 V', 'read'],
  ['Hardest grade', 'A 60 Z 8 V', 'read'],
  ['Densest structure', 'A 60 K 0 V', 'read'],
  ['Most open structure', 'A 60 K 16 V', 'read'],
  ['A mark without structure', 'A 60 K V', 'read'],
  ['A structure beyond the most open', 'A 60 K 17 V', 'refused'],
  ['A grain that is no size', 'A 61 K 8 V', 'refused'],
  ...['V', 'S', 'E', 'R', 'RF', 'B', 'BF', 'O', 'PL', 'Mg'].map(
    (bond): [string, string, string] => [`Bond ${bond}`, `A 60 K 8 ${bond}`, 'read'],
  ),
];

export const iso525 = casesOf('iso-525', [
  { checks: 'Abrasive of a mark', inputs, expected: 'A', got: () => part('abrasive') },
  {
    checks: 'Grain of a mark',
    inputs,
    expected: 60,
    unit: '',
    tolerance: 'exact',
    got: () => part('grain'),
  },
  { checks: 'Grade of a mark', inputs, expected: 'K', got: () => part('grade') },
  {
    checks: 'Structure of a mark',
    inputs,
    expected: 8,
    unit: '',
    tolerance: 'exact',
    got: () => part('structure'),
  },
  { checks: 'Bond of a mark', inputs, expected: 'V', got: () => part('bond') },
  ...RANGES.map(([checks, mark, answer]) => ({
    checks,
    inputs: mark,
    expected: answer,
    got: () => reads(mark),
  })),
]);
