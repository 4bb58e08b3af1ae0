import { guardFindings } from '../guard';
import { verdictOf } from '../verdict';
import { casesOf } from './case';

type Spec = Parameters<typeof guardFindings>[0];

const UNGUARDED: Spec['grinder'] = {
  motorNoLoadRpm: 2850,
  motorPowerW: 370,
  spindleMaximumRpm: 24_000,
  beltSteps: [],
  guard: 'none',
  postStiffnessNPerMm: null,
  wheelRotation: 'clockwise',
  shimsMm: [],
};

const verdict = (spec: Pick<Spec, 'kind'> & Partial<Spec>) =>
  verdictOf(
    guardFindings({
      grinder: UNGUARDED,
      shieldFitted: false,
      overrunMm: 4,
      widthMm: 12,
      ...spec,
    }),
    [],
  );

const note = 'The law asks for the guard; the verdict is how the rules say so.';

export const guards = [
  ...casesOf('osha-1910-215-a1', [
    {
      checks: 'Outside work without a guard',
      inputs: 'no guard on the grinder',
      note,
      expected: 'stop',
      got: () => verdict({ kind: 'outside' }),
    },
    {
      checks: 'A wheel within the bore is guarded by it',
      inputs: 'no guard, wheel 12 mm wide runs 4 mm past the bore',
      note,
      expected: 'clear',
      got: () => verdict({ kind: 'bore' }),
    },
    {
      checks: 'A wheel that leaves the bore is not',
      inputs: 'no guard, wheel 12 mm wide runs 12 mm past the bore',
      note,
      expected: 'stop',
      got: () => verdict({ kind: 'bore', overrunMm: 12 }),
    },
  ]),
];
