import { DEFAULT_SHOP_RULES } from '../../domain/shop-rules';
import { casesOf } from './case';

export const trialRun = casesOf('japan-118', [
  {
    checks: 'Trial run after a wheel change',
    inputs: 'wheel just changed',
    expected: 3,
    unit: 'min',
    tolerance: 'exact',
    got: () => DEFAULT_SHOP_RULES.trialRunMinutes,
  },
  {
    checks: 'Trial run before the day’s work',
    inputs: 'first use of the day',
    expected: 1,
    unit: 'min',
    tolerance: 'exact',
    got: () => DEFAULT_SHOP_RULES.dailyTrialRunMinutes,
  },
]);
