import type { Material } from '../../domain/materials';
import { convertUnit } from '../../units/entry-units';
import { recommendedMark, writeRecommended } from '../recommended-marks';
import { casesOf } from './case';
import type { PublishedCheck } from './types';

type Side = 'outside' | 'inside';

const TABLE: readonly [work: string, mark: string, asked: readonly [Material, Side, number]][] = [
  ['general and soft steel', 'A54-60 L-M', ['plain-carbon-annealed', 'outside', 2]],
  ['soft alloy steel', 'A54-60 L-M', ['alloy-annealed', 'outside', 2]],
  ['soft tool steel', 'A54-60 L-M', ['tool-annealed', 'outside', 2]],
  ['hardened steel, 1 in', 'A80 L', ['tool-hardened', 'outside', 1]],
  ['hardened alloy steel, 1 in', 'A80 L', ['alloy-hardened', 'outside', 1]],
  ['hardened steel, over 1 in', 'A60 K', ['tool-hardened', 'outside', 1.01]],
  ['hardened plain carbon steel, over 1 in', 'A60 K', ['plain-carbon-hardened', 'outside', 1.01]],
  ['cast iron', 'C36 J', ['cast-iron', 'outside', 2]],
  ['brass', 'C36 K', ['copper-alloy', 'outside', 2]],
  ['aluminium', 'A46 I', ['aluminium-alloy', 'outside', 2]],
  ['300 series stainless', 'A46 K', ['stainless', 'outside', 2]],
  ['hardened bushings, inside', 'A60 L', ['alloy-hardened', 'inside', 1]],
];

export const machinerysHandbookMarks = casesOf(
  'mh31-1317',
  TABLE.map(([work, mark, [material, side, inches]]): PublishedCheck => ({
    checks: 'Recommended wheel marking',
    inputs: work,
    at: 'table',
    expected: mark,
    got: () => asPrinted(recommendedMark(material, side, convertUnit(inches, 'in', 'mm'))),
  })),
);

/** The table joins abrasive and grain, and leaves out the bond: all of its wheels are vitrified. */
function asPrinted(mark: Parameters<typeof writeRecommended>[0]): string {
  const [abrasive, grain, grade] = writeRecommended(mark).split(' ');
  return `${abrasive}${grain} ${grade}`;
}
