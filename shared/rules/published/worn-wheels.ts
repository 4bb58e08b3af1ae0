import { DEFAULT_SHOP_RULES } from '../../domain/shop-rules';
import { speedLimits } from '../limits';
import { casesOf } from './case';
import { PLAIN_WHEEL } from './wheel';

const governing = () =>
  speedLimits({
    wheel: { ...PLAIN_WHEEL, diameterNewMm: 150, diameterNowMm: 120, markedRpm: 4456 },
    quill: null,
    grinder: null,
    rules: DEFAULT_SHOP_RULES,
  })[0];

const shared = {
  inputs: 'marked 4 456 rpm at 150 mm, worn to 120 mm',
  note: 'The regulation gives the wheel and would let it turn faster; 29 CFR 1910.215(d)(1), California and Washington keep the marked rpm, and so do the rules.',
};

export const wornWheels = casesOf('hk-59l-5-3', [
  {
    ...shared,
    checks: 'Limit of a worn wheel',
    expected: 4456,
    unit: 'rpm',
    tolerance: 'exact',
    got: () => governing()?.rpm.value ?? null,
  },
  {
    ...shared,
    checks: 'Which limit governs',
    expected: 'marked rpm',
    got: () => governing()?.kind ?? null,
  },
]);
