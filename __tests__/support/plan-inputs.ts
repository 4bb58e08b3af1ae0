import type { GrinderData, LatheData, QuillData } from '@/shared/domain/machines';
import type { Operation, PlanInput, SetupInputs } from '@/shared/domain/setups';
import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import type { WheelData } from '@/shared/domain/wheels';
import { assemblePlanInput, emptySetupInputs, type FindingCode, type Plan } from '@/shared/rules';

/** Invented machines and wheels of ordinary sizes, for tests that need a whole plan. */
export const LATHE: LatheData = {
  spindleSpeedsRpm: [45, 70, 115, 180, 290, 460, 730, 1150, 1800],
  feedsMmPerRev: [0.05, 0.1, 0.15, 0.2, 0.3, 0.4, 0.5, 0.6, 0.8, 1, 1.2],
  crossSlideDivisionMm: 0.01,
  crossSlideReads: 'diameter',
  crossSlideDivisionsPerTurn: 200,
  compoundZero: 'cross-slide',
  compoundDivisionMm: 0.02,
  compoundTravelMm: 90,
  spindleNose: 'locked',
};

export const BORE_GRINDER: GrinderData = {
  motorNoLoadRpm: 2850,
  motorPowerW: 370,
  spindleMaximumRpm: 24_000,
  beltSteps: [
    {
      id: 'a',
      name: 'A',
      drivingPulleyMm: 90,
      drivenPulleyMm: 30,
      beltThicknessMm: 2,
      measured: null,
    },
    {
      id: 'b',
      name: 'B',
      drivingPulleyMm: 120,
      drivenPulleyMm: 22,
      beltThicknessMm: 2,
      measured: null,
    },
    {
      id: 'c',
      name: 'C',
      drivingPulleyMm: 150,
      drivenPulleyMm: 20,
      beltThicknessMm: 2,
      measured: null,
    },
  ],
  guard: 'none',
  postStiffnessNPerMm: 6000,
  wheelRotation: 'clockwise',
};

export const SHAFT_GRINDER: GrinderData = {
  motorNoLoadRpm: 2850,
  motorPowerW: 750,
  spindleMaximumRpm: 7000,
  beltSteps: [
    {
      id: 'a',
      name: '1',
      drivingPulleyMm: 80,
      drivenPulleyMm: 80,
      beltThicknessMm: 2.5,
      measured: null,
    },
    {
      id: 'b',
      name: '2',
      drivingPulleyMm: 100,
      drivenPulleyMm: 72,
      beltThicknessMm: 2.5,
      measured: null,
    },
    {
      id: 'c',
      name: '3',
      drivingPulleyMm: 120,
      drivenPulleyMm: 60,
      beltThicknessMm: 2.5,
      measured: null,
    },
  ],
  guard: 'fixed',
  postStiffnessNPerMm: 6000,
  wheelRotation: 'anticlockwise',
};

export const QUILL: QuillData = {
  segments: [{ lengthMm: 60, diameterMm: 16 }],
  material: 'steel',
  markedMaximumRpm: 24_000,
  seatDiameterMm: 8,
  threadHand: 'right',
  measuredStiffnessNPerMm: null,
  measuredFrequencyHz: null,
};

export const ARBOR: QuillData = {
  segments: [{ lengthMm: 40, diameterMm: 25 }],
  material: 'steel',
  markedMaximumRpm: null,
  seatDiameterMm: 20,
  threadHand: 'left',
  measuredStiffnessNPerMm: null,
  measuredFrequencyHz: null,
};

export const SMALL_WHEEL: WheelData = {
  marking: 'A 60 K 7 V',
  diameterNewMm: 28,
  diameterNowMm: 27,
  widthMm: 12,
  holeMm: 8,
  markedRpm: 22_000,
  markedSpeedMPerS: null,
  markingReadOn: 'box',
  mounted: null,
  looked: 'sound',
  rung: 'clear',
  expiresOn: null,
  state: 'on the rack',
  setAsideReason: null,
};

export const LARGE_WHEEL: WheelData = {
  ...SMALL_WHEEL,
  diameterNewMm: 125,
  diameterNowMm: 120,
  widthMm: 16,
  holeMm: 20,
  markedRpm: null,
  markedSpeedMPerS: 35,
  markingReadOn: 'blotter',
};

export const TODAY = '2026-03-02';

const shop = { lathe: LATHE, rules: DEFAULT_SHOP_RULES, today: TODAY };
const machine = { latheId: 'lathe', grinderId: 'grinder', quillId: 'quill', workRotation: null };

/** Jaws of a 160 mm chuck that indicate 0.11 mm, ground under a ring, with a shield. */
export const jawsInput = (): PlanInput => {
  const inputs: SetupInputs = emptySetupInputs('jaws');
  return assemblePlanInput(
    {
      ...inputs,
      work: {
        ...inputs.work,
        material: 'alloy-hardened',
        jawBoreMm: 40,
        lengthMm: 32,
        padWidthMm: 12,
        preload: 'ring',
        clearDepthMm: 20,
        nearDistanceMm: 20,
        nearRunOutMm: 0.1,
        nearHighSpotDeg: 100,
        farDistanceMm: 100,
        farRunOutMm: 0.12,
        farHighSpotDeg: 110,
      },
      machine: { ...machine, beltStepId: 'b', shieldFitted: true },
      wheel: { wheelId: 'wheel', typed: null },
    },
    { ...shop, grinder: BORE_GRINDER, quill: QUILL, wheel: SMALL_WHEEL },
  );
};

/** A hardened bush, 40 by 30 mm, 0.15 mm to come off on diameter. */
export const boreInput = (): PlanInput => {
  const inputs = emptySetupInputs('bore');
  return assemblePlanInput(
    {
      ...inputs,
      work: {
        ...inputs.work,
        material: 'tool-hardened',
        diameterMm: 40,
        lengthMm: 30,
        stockOnDiameterMm: 0.15,
        toleranceMm: 0.016,
        runOutMm: 0.05,
        throughBore: true,
      },
      machine: { ...machine, beltStepId: 'b', shieldFitted: false },
      wheel: { wheelId: 'wheel', typed: null },
    },
    { ...shop, grinder: BORE_GRINDER, quill: QUILL, wheel: SMALL_WHEEL },
  );
};

/** A hardened shaft of 40 mm, 150 mm between centres, 0.10 mm to come off on diameter. */
export const outsideInput = (): PlanInput => {
  const inputs = emptySetupInputs('outside');
  return assemblePlanInput(
    {
      ...inputs,
      work: {
        ...inputs.work,
        material: 'alloy-hardened',
        diameterMm: 40,
        lengthMm: 110,
        stockOnDiameterMm: 0.1,
        toleranceMm: 0.02,
        runOutMm: 0.03,
        holding: 'centres',
        unsupportedLengthMm: 150,
      },
      machine: { ...machine, beltStepId: 'b', shieldFitted: false },
      wheel: { wheelId: 'wheel', typed: null },
    },
    { ...shop, grinder: SHAFT_GRINDER, quill: ARBOR, wheel: LARGE_WHEEL },
  );
};

export const GOOD_INPUTS: Record<Operation, () => PlanInput> = {
  jaws: jawsInput,
  bore: boreInput,
  outside: outsideInput,
};

export const codes = (plan: Plan) => plan.findings.map(({ code }) => code);
export const found = (plan: Plan, code: FindingCode) =>
  plan.findings.find((entry) => entry.code === code);
export const withWork = (input: PlanInput, work: Partial<PlanInput['work']>): PlanInput => ({
  ...input,
  work: { ...input.work, ...work },
});
export const withCut = (input: PlanInput, cut: Partial<PlanInput['cut']>): PlanInput => ({
  ...input,
  cut: { ...input.cut, ...cut },
});
export const withStep = (input: PlanInput, beltStepId: string | null): PlanInput => ({
  ...input,
  machine: { ...input.machine, beltStepId },
});
