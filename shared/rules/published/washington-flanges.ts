import { leastFlange } from '../mounting';
import { casesOf } from './case';

export const washingtonFlanges = casesOf('wac-296-806-40516', [
  {
    checks: 'Least diameter of a flange: a third of the wheel',
    inputs: '175 mm wheel',
    note: 'The rule gives the third; the wheel is ours.',
    expected: 58.33,
    unit: 'mm',
    tolerance: { within: 0.005 },
    got: () => leastFlange(175).value,
  },
]);
