import { dressLead, dressTraverse, dressWidth } from '../dressing';
import { stated } from '../figures';
import { casesOf } from './case';

const traverse = (overlap: number) =>
  dressTraverse(
    dressLead(stated('width', [0.273, 'mm']), overlap),
    stated('spindle speed', [1410, 'rpm']),
  ).value;

export const modernGrindingDressing = casesOf('modern-grinding-dressing', [
  {
    checks: 'Width that a diamond cuts',
    inputs: 'tip radius 0.38 mm, 0.025 mm deep',
    at: 'worked example',
    note: 'The source rounds up on the way: the exact chord of its figures is 0.2711 mm.',
    expected: 0.273,
    unit: 'mm',
    tolerance: { share: 0.012 },
    got: () => dressWidth(0.38, 0.025, false).value,
  },
  {
    checks: 'Traverse of the dresser, overlap 2',
    inputs: 'width 0.273 mm, 1410 rpm',
    at: 'worked example',
    expected: 192.5,
    unit: 'mm/min',
    tolerance: { within: 0.05 },
    got: () => traverse(2),
  },
  {
    checks: 'Traverse of the dresser, overlap 4',
    inputs: 'width 0.273 mm, 1410 rpm',
    at: 'worked example',
    expected: 96.25,
    unit: 'mm/min',
    tolerance: { within: 0.05 },
    got: () => traverse(4),
  },
]);
