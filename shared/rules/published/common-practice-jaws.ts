import { convertUnit } from '../../units/entry-units';
import { planJaws } from '../jaws';
import { offsetFromRunOut } from '../offset';
import { casesOf } from './case';

/** In the middle of the run-outs told; jaws of an ordinary width, turned half way between best and worst. */
function ground() {
  const plan = planJaws({
    jawCount: 3,
    boreMm: 50,
    padWidthMm: 10,
    padBackMm: 0,
    padFrontMm: 40,
    lastGroundMm: null,
    offset: {
      at0: offsetFromRunOut(convertUnit(0.0045, 'in', 'mm'), 15),
      perMm: { aMm: 0, bMm: 0 },
    },
    padErrors: [],
  });
  const touches = plan?.contacts.map(({ touchesAtMm }) => touchesAtMm) ?? [];
  return {
    touchingIn: convertUnit(Math.max(...touches), 'mm', 'in'),
    cleanIn: convertUnit(plan?.cleanUp.value ?? NaN, 'mm', 'in'),
  };
}

export const commonPracticeJaws = casesOf('practice-jaw-clean-up', [
  {
    checks: 'Infeed until all three jaws touch',
    inputs: 'run-out 0.004 to 0.005 in, a thousandth a pass',
    note: 'Told as about three thousandths; counted in whole passes.',
    expected: 0.003,
    unit: 'in',
    tolerance: { within: 0.001 },
    got: () => ground().touchingIn,
  },
  {
    checks: 'Infeed from there until all three are clean',
    inputs: 'the same chuck',
    note: 'Told as within one more thousandth: anything from none to one.',
    expected: 0.0005,
    unit: 'in',
    tolerance: { within: 0.0005 },
    got: () => ground().cleanIn - ground().touchingIn,
  },
]);
