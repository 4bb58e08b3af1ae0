import type { Operation, PlanInput, SetupInputs } from '@/shared/domain/setups';
import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import { assemblePlanInput, emptySetupInputs, type FindingCode, type Plan } from '@/shared/rules';

import {
  ARBOR,
  BORE_GRINDER,
  LARGE_WHEEL,
  LATHE,
  QUILL,
  SHAFT_GRINDER,
  SMALL_WHEEL,
} from './plan-machines';

export * from './plan-machines';

export const TODAY = '2026-03-02';

const shop = { lathe: LATHE, rules: DEFAULT_SHOP_RULES, today: TODAY };
const machine = {
  latheId: 'lathe',
  grinderId: 'grinder',
  quillId: 'quill',
  workRotation: null,
  belowCentreMm: null,
};

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

/** A lathe centre in its spindle: 60 degrees on a 25 mm shank, 0.10 mm to come off on diameter. */
export const taperInput = (): PlanInput => {
  const inputs = emptySetupInputs('taper');
  return assemblePlanInput(
    {
      ...inputs,
      work: {
        ...inputs.work,
        material: 'tool-hardened',
        diameterMm: 25,
        lengthMm: 20,
        includedAngleDeg: 60,
        stockOnDiameterMm: 0.1,
        toleranceMm: 0.02,
        runOutMm: 0.03,
        holding: 'spindle taper',
        unsupportedLengthMm: 40,
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
  taper: taperInput,
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
