import { sparkOutPasses, takePass } from '../spring';
import { casesOf } from './case';

/** A pass as long as one time constant of the decay leaves 1/e of the spring. */
const ONE_TIME_CONSTANT = 1 - Math.exp(-1);

function leftAfter(passes: number): number {
  let springMm = 1;
  for (let pass = 0; pass < passes; pass += 1)
    ({ springMm } = takePass(0, springMm, ONE_TIME_CONSTANT));
  return springMm;
}

export const marinescu = casesOf('marinescu-18', [
  {
    checks: 'Spring left after three time constants of spark-out',
    inputs: 'three passes of one time constant each',
    expected: 5,
    unit: '%',
    tolerance: { within: 0.5 },
    got: () => 100 * leftAfter(3),
  },
  {
    checks: 'Passes of one time constant until 5 % is left',
    inputs: 'spring down to 5 %',
    expected: 3,
    unit: 'passes',
    tolerance: 'exact',
    got: () => sparkOutPasses(1, 0.05, ONE_TIME_CONSTANT),
  },
]);
