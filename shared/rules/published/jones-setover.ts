import { convertUnit } from '../../units/entry-units';
import { stated } from '../figures';
import { halfAngle, tailstockSetover, taperPerLength } from '../taper';
import { casesOf } from './case';

const mm = (inches: number) => convertUnit(inches, 'in', 'mm');
const perFoot = (inches: number) => stated('taper', [inches / 12, '1']);
const setover = (totalIn: number, taper: ReturnType<typeof stated>) =>
  convertUnit(tailstockSetover(mm(totalIn), taper).value ?? NaN, 'mm', 'in');

export const jonesSetover = casesOf('jones-setover', [
  {
    checks: 'Setover of the tailstock',
    inputs: '1 in to the foot, 9 in in all',
    expected: 3 / 8,
    printed: '3/8',
    unit: 'in',
    tolerance: 'exact',
    got: () => setover(9, perFoot(1)),
  },
  {
    checks: 'Setover of the tailstock',
    inputs: '2 1/2 to 2 in over 6 in, 9 in in all',
    expected: 3 / 8,
    printed: '3/8',
    unit: 'in',
    tolerance: 'exact',
    got: () => setover(9, taperPerLength(halfAngle(mm(2.5), mm(2), mm(6)))),
  },
  {
    checks: 'Setover of the tailstock',
    inputs: '1 1/2 in to the foot, 8 in in all',
    expected: 1 / 2,
    printed: '1/2',
    unit: 'in',
    tolerance: 'exact',
    got: () => setover(8, perFoot(1.5)),
  },
]);
