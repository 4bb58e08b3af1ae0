import type { Material } from '../../domain/materials';
import { convertUnit } from '../../units/entry-units';
import { contactLength, equivalentDiameter, removalRate } from '../contact';
import { specificEnergy } from '../energy';
import { stated } from '../figures';
import { grindingPower, tangentialForce } from '../force';
import { wheelSpeed } from '../speed';
import { casesOf } from './case';
import type { PublishedCheck } from './types';

const inch = (value: number) => convertUnit(value, 'in', 'mm');

/** A wheel 1 in wide over flat work at 60 in/min, 0.002 in deep: the width stands for a circumference. */
const removal = () => removalRate(inch(1) / Math.PI, inch(0.002), inch(60));
const power = () =>
  grindingPower(
    stated('specific energy', [convertUnit(15, 'hp·min/in3', 'J/mm3'), 'J/mm3']),
    removal(),
  );

const worked = casesOf('kalpakjian-force', [
  {
    checks: 'Metal removed each minute',
    inputs: 'width 1 in, depth 0.002 in, work 60 in/min',
    expected: 0.12,
    unit: 'in³/min',
    tolerance: 'exact',
    got: () => convertUnit(removal().value ?? NaN, 'mm3/s', 'in3/min'),
  },
  {
    checks: 'Power at the wheel',
    inputs: '0.12 in³/min at 15 hp·min/in³',
    expected: 1.8,
    unit: 'hp',
    tolerance: 'exact',
    got: () => convertUnit(power().value ?? NaN, 'W', 'hp'),
  },
  {
    checks: 'Force along the rim',
    inputs: '1.8 hp, wheel 10 in, 4 000 rpm',
    expected: 5.67,
    unit: 'lb',
    tolerance: { within: 0.005 },
    got: () =>
      convertUnit(tangentialForce(power(), wheelSpeed(inch(10), 4000)).value ?? NaN, 'N', 'lbf'),
  },
]);

const TABLE: readonly [work: string, Material, low: number, high: number][] = [
  ['aluminium', 'aluminium-alloy', 7, 27],
  ['cast iron', 'cast-iron', 12, 60],
  ['low-carbon steel', 'plain-carbon-annealed', 14, 68],
  ['tool steel (67 HRC)', 'tool-hardened', 18, 82],
];

const ranges = casesOf('kalpakjian-energy', [
  ...TABLE.flatMap(([work, material, low, high]): PublishedCheck[] => [
    {
      checks: 'Specific energy, least',
      inputs: work,
      expected: low,
      unit: 'J/mm³',
      tolerance: 'exact',
      got: () => specificEnergy(material).band?.low ?? null,
    },
    {
      checks: 'Specific energy, most',
      inputs: work,
      expected: high,
      unit: 'J/mm³',
      tolerance: 'exact',
      got: () => specificEnergy(material).band?.high ?? null,
    },
  ]),
  {
    checks: 'Specific energy from the inch column to the metric one',
    inputs: '10 hp·min/in³',
    expected: 27.3,
    unit: 'J/mm³',
    tolerance: { within: 0.05 },
    got: () => convertUnit(10, 'hp·min/in3', 'J/mm3'),
  },
]);

const contact = casesOf('kalpakjian-contact', [
  {
    checks: 'Length of contact on flat work',
    inputs: 'wheel 200 mm, depth 0.05 mm',
    expected: 3.2,
    unit: 'mm',
    tolerance: { within: 0.05 },
    got: () => contactLength(0.05, equivalentDiameter(200, 1e12, 'outside')).value,
  },
]);

export const kalpakjian = [...worked, ...ranges, ...contact];
