import fc from 'fast-check';

import { LIMITS, type LimitName } from '@/shared/domain/limits';
import {
  COMPOUND_ZEROS,
  DIAL_READINGS,
  GUARDS,
  QUILL_MATERIALS,
  ROTATIONS,
  SPINDLE_NOSES,
  THREAD_HANDS,
  type GrinderData,
  type LatheData,
  type QuillData,
} from '@/shared/domain/machines';
import { MATERIALS } from '@/shared/domain/materials';
import {
  HOLDINGS,
  OPERATIONS,
  PASS_STROKES,
  PRELOADS,
  SHOULDERS,
  SIDES,
  TAPER_GIVEN,
  TAPER_METHODS,
  type PlanInput,
  type SetupInputs,
  type TypedWheel,
  type WorkInputs,
} from '@/shared/domain/setups';
import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import {
  LOOK_RESULTS,
  MARKING_PLACES,
  RING_RESULTS,
  WHEEL_STATES,
  type WheelData,
} from '@/shared/domain/wheels';
import { assemblePlanInput } from '@/shared/rules';

/** Anything a field may hold: its ends, ordinary sizes near its lower end, and all between. */
function within(name: LimitName): fc.Arbitrary<number> {
  const { min, max } = LIMITS[name];
  return fc.oneof(
    { weight: 1, arbitrary: fc.constantFrom(min, max) },
    {
      weight: 6,
      arbitrary: fc.double({ min: 0, max: 1, noNaN: true }).map((x) => spread(x, min, max)),
    },
  );
}

/** Spreads evenly over powers of ten where the range allows it. */
function spread(share: number, min: number, max: number): number {
  if (min <= 0) return min + share * (max - min) * share;
  return Math.min(min * (max / min) ** share, max);
}

const maybe = <T>(arbitrary: fc.Arbitrary<T>) => fc.option(arbitrary, { nil: null, freq: 8 });
const field = (name: LimitName) => maybe(within(name));
const oneOf = <T>(values: readonly T[]) => fc.constantFrom(...values);
const whole = (name: LimitName) => maybe(fc.integer(LIMITS[name]));

const work: fc.Arbitrary<WorkInputs> = fc.record({
  material: maybe(oneOf(MATERIALS)),
  diameterMm: field('diameterMm'),
  lengthMm: field('lengthMm'),
  stockOnDiameterMm: field('stockOnDiameterMm'),
  toleranceMm: field('toleranceMm'),
  runOutMm: field('runOutMm'),
  taperSide: oneOf(SIDES),
  taperMethod: oneOf(TAPER_METHODS),
  taperGiven: oneOf(TAPER_GIVEN),
  includedAngleDeg: field('includedAngleDeg'),
  smallDiameterMm: field('smallDiameterMm'),
  taperPerLength: field('taperPerLength'),
  shoulders: oneOf(SHOULDERS),
  warmerK: field('warmerK'),
  headEndMm: field('diameterMm'),
  tailEndMm: field('diameterMm'),
  endsApartMm: field('lengthMm'),
  interrupted: fc.boolean(),
  holding: maybe(oneOf(HOLDINGS)),
  unsupportedLengthMm: field('unsupportedLengthMm'),
  shaftDiameterMm: field('diameterMm'),
  throughBore: maybe(fc.boolean()),
  clearDepthMm: field('clearDepthMm'),
  jawCount: whole('jawCount'),
  jawBoreMm: field('diameterMm'),
  padWidthMm: field('padWidthMm'),
  lastGroundDiameterMm: field('diameterMm'),
  preload: maybe(oneOf(PRELOADS)),
  nearDistanceMm: field('distanceMm'),
  nearRunOutMm: field('runOutMm'),
  nearHighSpotDeg: field('highSpotDeg'),
  farDistanceMm: field('distanceMm'),
  farRunOutMm: field('runOutMm'),
  farHighSpotDeg: field('highSpotDeg'),
  bellMouthMm: field('bellMouthMm'),
});

const lathe: fc.Arbitrary<LatheData> = fc.record({
  spindleSpeedsRpm: fc.array(within('spindleSpeedRpm'), { maxLength: 6 }),
  feedsMmPerRev: fc.array(within('feedMmPerRev'), { maxLength: 6 }),
  crossSlideDivisionMm: within('dialDivisionMm'),
  crossSlideReads: oneOf(DIAL_READINGS),
  crossSlideDivisionsPerTurn: whole('dialDivisions'),
  compoundZero: maybe(oneOf(COMPOUND_ZEROS)),
  compoundDivisionMm: field('dialDivisionMm'),
  compoundTravelMm: field('compoundTravelMm'),
  compoundMmPerTurn: field('slideMmPerTurn'),
  spindleNose: maybe(oneOf(SPINDLE_NOSES)),
});

const beltStep = fc.record({
  name: fc.constantFrom('1', '2', 'A'),
  drivingPulleyMm: within('pulleyMm'),
  drivenPulleyMm: within('pulleyMm'),
  beltThicknessMm: within('beltThicknessMm'),
  measured: maybe(
    fc.record({
      rpm: within('spindleRpm'),
      measuredOn: fc.constant('2026-01-05'),
      instrument: fc.constant('tachometer'),
    }),
  ),
});

const grinder: fc.Arbitrary<GrinderData> = fc.record({
  motorNoLoadRpm: within('motorRpm'),
  motorPowerW: within('motorPowerW'),
  spindleMaximumRpm: field('spindleRpm'),
  beltSteps: fc
    .array(beltStep, { maxLength: 4 })
    .map((steps) => steps.map((step, index) => ({ ...step, id: `step-${index}` }))),
  guard: oneOf(GUARDS),
  postStiffnessNPerMm: field('stiffnessNPerMm'),
  wheelRotation: maybe(oneOf(ROTATIONS)),
  shimsMm: fc.array(within('shimMm'), { maxLength: 6 }),
});

const quill: fc.Arbitrary<QuillData> = fc.record({
  segments: fc.array(
    fc.record({ lengthMm: within('quillLengthMm'), diameterMm: within('quillDiameterMm') }),
    { minLength: 1, maxLength: 3 },
  ),
  material: oneOf(QUILL_MATERIALS),
  markedMaximumRpm: field('spindleRpm'),
  seatDiameterMm: within('quillDiameterMm'),
  threadHand: maybe(oneOf(THREAD_HANDS)),
  measuredStiffnessNPerMm: field('stiffnessNPerMm'),
  measuredFrequencyHz: field('frequencyHz'),
});

const marking = fc.constantFrom('A 60 K 7 V', 'C 36 J 8 V', 'A 46 L B', 'D126 R100 B', 'worn off');

const typedWheel: fc.Arbitrary<TypedWheel> = fc.record({
  marking: maybe(marking),
  diameterNewMm: field('wheelDiameterMm'),
  diameterNowMm: field('wheelDiameterMm'),
  widthMm: field('wheelWidthMm'),
  holeMm: field('wheelHoleMm'),
  markedRpm: field('wheelRpm'),
  markedSpeedMPerS: field('wheelSpeedMPerS'),
  markingReadOn: maybe(oneOf(MARKING_PLACES)),
  looked: maybe(oneOf(LOOK_RESULTS)),
  rung: maybe(oneOf(RING_RESULTS)),
});

const wheel: fc.Arbitrary<WheelData> = fc.record({
  marking: maybe(marking),
  diameterNewMm: within('wheelDiameterMm'),
  diameterNowMm: within('wheelDiameterMm'),
  widthMm: within('wheelWidthMm'),
  holeMm: within('wheelHoleMm'),
  markedRpm: field('wheelRpm'),
  markedSpeedMPerS: field('wheelSpeedMPerS'),
  markingReadOn: maybe(oneOf(MARKING_PLACES)),
  mounted: fc.option(
    fc.record({
      mandrelDiameterMm: within('quillDiameterMm'),
      overhangMm: within('quillLengthMm'),
      threaded: fc.boolean(),
      makerMaximumRpm: field('wheelRpm'),
    }),
    { nil: null, freq: 1 },
  ),
  smallestUsableMm: field('wheelDiameterMm'),
  looked: maybe(oneOf(LOOK_RESULTS)),
  rung: maybe(oneOf(RING_RESULTS)),
  expiresOn: maybe(fc.constantFrom('2020-01-01', '2030-01-01')),
  state: oneOf(WHEEL_STATES),
  setAsideReason: maybe(fc.constant('dropped')),
  unsigned: fc.boolean(),
});

const inputs: fc.Arbitrary<SetupInputs> = fc.record({
  operation: oneOf(OPERATIONS),
  work,
  machine: fc.record({
    latheId: fc.constant('lathe'),
    grinderId: fc.constant('grinder'),
    quillId: fc.constant('quill'),
    beltStepId: maybe(fc.constantFrom('step-0', 'step-1', 'step-2')),
    shieldFitted: fc.boolean(),
    belowCentreMm: field('belowCentreMm'),
    workRotation: maybe(oneOf(ROTATIONS)),
  }),
  wheel: fc.record({ wheelId: fc.constant('wheel'), typed: fc.option(typedWheel, { nil: null }) }),
  cut: fc.record({
    latheRpm: field('spindleSpeedRpm'),
    roughInfeedMm: field('infeedMm'),
    finishInfeedMm: field('infeedMm'),
    roughTraverseMmPerRev: field('traverseMmPerRev'),
    finishTraverseMmPerRev: field('traverseMmPerRev'),
    finishStockMm: field('finishStockMm'),
    sparkOutPasses: whole('sparkOutPasses'),
    overrunMm: field('overrunMm'),
    softnessPerMm: field('softnessPerMm'),
    strokes: maybe(oneOf(PASS_STROKES)),
  }),
  dress: fc.record({
    tipRadiusMm: field('tipRadiusMm'),
    diamondCarats: field('diamondCarats'),
    roughDepthMm: field('dressDepthMm'),
    roughPasses: whole('dressPasses'),
    roughOverlap: field('dressOverlap'),
    finishDepthMm: field('dressDepthMm'),
    finishPasses: whole('dressPasses'),
    finishOverlap: field('dressOverlap'),
  }),
});

/** Everything that the fields and the shop's machines can hold, sensible or not. */
export const anyPlanInput: fc.Arbitrary<PlanInput> = fc
  .record({
    inputs,
    found: fc.record({
      lathe: maybe(lathe),
      grinder: maybe(grinder),
      quill: maybe(quill),
      wheel: maybe(wheel),
      rules: fc.constant(DEFAULT_SHOP_RULES),
      today: fc.constant('2026-03-02'),
    }),
  })
  .map(({ inputs: setup, found }) => assemblePlanInput(setup, found));
