import { overrun, travel } from '../traverse';
import { casesOf } from './case';

export const commonPracticeOverrun = casesOf('practice-overrun', [
  {
    checks: 'Overrun at each end: a third of the wheel’s width',
    inputs: 'wheel 12 mm wide',
    expected: 4,
    unit: 'mm',
    tolerance: 'exact',
    got: () => overrun(12, null).value,
  },
  {
    checks: 'Travel of the carriage, so that the wheel never wholly leaves the surface',
    inputs: 'surface 30 mm, wheel 12 mm, overrun 4 mm',
    expected: 26,
    unit: 'mm',
    tolerance: 'exact',
    got: () => travel(30, 12, overrun(12, null)).value,
  },
]);
