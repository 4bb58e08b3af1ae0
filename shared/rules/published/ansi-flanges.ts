import { convertUnit } from '../../units/entry-units';
import { takesFlanges } from '../mounting';
import { casesOf } from './case';
import { PLAIN_WHEEL } from './wheel';

const flanges = (inches: number, side: 'outside' | 'inside') =>
  takesFlanges({ ...PLAIN_WHEEL, diameterNewMm: convertUnit(inches, 'in', 'mm') }, side)
    ? 'flanges'
    : 'none';

export const ansiFlanges = casesOf('ansi-b7-1-2010-5-1', [
  {
    checks: 'Flanges of an internal wheel under 2 in',
    inputs: '1.9 in wheel in a bore',
    expected: 'none',
    got: () => flanges(1.9, 'inside'),
  },
  {
    checks: 'Flanges of an internal wheel of 2 in',
    inputs: '2 in wheel in a bore',
    expected: 'flanges',
    got: () => flanges(2, 'inside'),
  },
  {
    checks: 'Flanges of a wheel for outside work',
    inputs: '1.9 in wheel on a shaft',
    expected: 'flanges',
    got: () => flanges(1.9, 'outside'),
  },
]);
