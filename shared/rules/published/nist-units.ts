import { convertUnit } from '../../units/entry-units';
import { casesOf } from './case';

export const nistUnits = casesOf('nist-sp-811', [
  {
    checks: 'The inch',
    inputs: '1 in',
    expected: 25.4,
    unit: 'mm',
    tolerance: 'exact',
    got: () => convertUnit(1, 'in', 'mm'),
  },
  {
    checks: 'The foot',
    inputs: '1 ft',
    expected: 0.3048,
    unit: 'm',
    tolerance: 'exact',
    got: () => convertUnit(1, 'ft', 'm'),
  },
  {
    checks: 'The pound',
    inputs: '1 lb',
    expected: 0.45359237,
    unit: 'kg',
    tolerance: 'exact',
    got: () => convertUnit(1, 'lb', 'kg'),
  },
]);
