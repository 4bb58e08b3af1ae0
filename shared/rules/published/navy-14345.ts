import { convertUnit } from '../../units/entry-units';
import { halfAngle, tailstockSetover, taperPerLength } from '../taper';
import { casesOf } from './case';

const mm = (inches: number) => convertUnit(inches, 'in', 'mm');

export const navy14345 = casesOf('navy-14345', [
  {
    checks: 'Setover of the tailstock',
    inputs: '12 in long, from 3 to 2 in',
    expected: 1 / 2,
    printed: '1/2',
    unit: 'in',
    tolerance: 'exact',
    got: () => {
      const taper = taperPerLength(halfAngle(mm(3), mm(2), mm(12)));
      return convertUnit(tailstockSetover(mm(12), taper).value ?? NaN, 'mm', 'in');
    },
  },
]);
