import { limitRpm, wheelLimits } from '../limits';
import { verdictOf } from '../verdict';
import { markingFindings } from '../wheel-checks';
import { casesOf } from './case';

const head = (makerMaximumRpm: number | null) => ({
  markedRpm: null,
  markedSpeedMPerS: null,
  diameterNewMm: 20,
  mounted: { mandrelDiameterMm: 6, overhangMm: 13, threaded: false, makerMaximumRpm },
});

export const mountedWheels = casesOf('ansi-b7-1-2000-10-1', [
  {
    checks: 'A mounted wheel without the maker’s figure',
    inputs: 'no rpm for this shape, mandrel and overhang',
    expected: 'stop',
    got: () => verdictOf(markingFindings(head(null), false), []),
  },
  {
    checks: 'The maker’s figure is the limit',
    inputs: 'maker’s figure 34 000 rpm for this overhang',
    note: 'The standard makes the maker’s figure the limit; the figure is ours.',
    expected: 34_000,
    unit: 'rpm',
    tolerance: 'exact',
    got: () => {
      const [limit] = wheelLimits(head(34_000));
      return limit === undefined ? null : limitRpm(limit);
    },
  },
]);
