import { convertUnit } from '../../units/entry-units';
import { expectedRpm, worstRpm } from '../speed';
import { casesOf } from './case';

const pulleys = () => ({
  drivingPulleyMm: convertUnit(4, 'in', 'mm'),
  drivenPulleyMm: convertUnit(20, 'in', 'mm'),
  beltThicknessMm: 0,
  measured: null,
});

const shared = {
  inputs: '4 in pulley at 1 500 rpm on a 20 in pulley',
  expected: 300,
  unit: 'rpm',
  tolerance: 'exact' as const,
};

export const woodTurning = casesOf('wood-turning', [
  {
    ...shared,
    checks: 'Speed of the driven shaft, as expected',
    got: () => expectedRpm(1500, pulleys()).value,
  },
  {
    ...shared,
    checks: 'Speed of the driven shaft, as held against limits',
    got: () => worstRpm(1500, pulleys()).value,
  },
]);
