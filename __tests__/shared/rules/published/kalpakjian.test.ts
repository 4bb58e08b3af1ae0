import { evaluate } from 'mathjs';

import { specificEnergy } from '@/shared/rules/energy';
import { judge } from '@/shared/rules/published';
import { kalpakjian } from '@/shared/rules/published/kalpakjian';

import { checkPublished } from '../../../support/published';

checkPublished(kalpakjian);

it.each([
  ['aluminium-alloy', 14],
  ['cast-iron', 27],
  ['plain-carbon-annealed', 31],
  ['tool-hardened', 38],
] as const)('works for %s with the geometric mean of the range, %d J/mm3', (material, mean) => {
  expect(specificEnergy(material).value).toBeCloseTo(mean, 0);
});

it('finds the force of the worked example as mathjs does, which carries the units itself', () => {
  const pounds = evaluate(
    'number((0.12 in^3/minute * 15 hp minute/in^3) / (pi * 10 in * 4000/minute), lbf)',
  );
  const force = kalpakjian.find(({ checks }) => checks === 'Force along the rim');
  expect(force && judge(force).got).toBeCloseTo(pounds, 6);
});
