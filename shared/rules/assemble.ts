import type { GrinderData, LatheData, QuillData } from '../domain/machines';
import type { Operation, PlanInput, SetupInputs, TypedWheel } from '../domain/setups';
import type { ShopRules } from '../domain/shop-rules';
import type { WheelData } from '../domain/wheels';

const THREE_JAWS = 3;

/**
 * A new setup with nothing answered yet, but three jaws, which most chucks have.
 *
 * @param operation - which kind of work the setup is for.
 * @returns inputs with null for everything unanswered.
 */
export function emptySetupInputs(operation: Operation): SetupInputs {
  return {
    operation,
    work: {
      material: null,
      diameterMm: null,
      lengthMm: null,
      stockOnDiameterMm: null,
      toleranceMm: null,
      runOutMm: null,
      interrupted: false,
      holding: null,
      unsupportedLengthMm: null,
      shaftDiameterMm: null,
      throughBore: null,
      clearDepthMm: null,
      jawCount: THREE_JAWS,
      jawBoreMm: null,
      padWidthMm: null,
      lastGroundDiameterMm: null,
      preload: null,
      nearDistanceMm: null,
      nearRunOutMm: null,
      nearHighSpotDeg: null,
      farDistanceMm: null,
      farRunOutMm: null,
      farHighSpotDeg: null,
      bellMouthMm: null,
    },
    machine: {
      latheId: null,
      grinderId: null,
      quillId: null,
      beltStepId: null,
      shieldFitted: false,
      workRotation: null,
    },
    wheel: { wheelId: null, typed: null },
    cut: {
      latheRpm: null,
      roughInfeedMm: null,
      finishInfeedMm: null,
      roughTraverseMmPerRev: null,
      finishTraverseMmPerRev: null,
      finishStockMm: null,
      sparkOutPasses: null,
      overrunMm: null,
      strokes: null,
    },
    dress: {
      tipRadiusMm: null,
      diamondCarats: null,
      roughDepthMm: null,
      roughPasses: null,
      roughOverlap: null,
      finishDepthMm: null,
      finishPasses: null,
      finishOverlap: null,
    },
  };
}

/**
 * A wheel typed in for one setup, once it can be reckoned with. Diameter now is the new one until given.
 *
 * @param typed - what was typed so far, mm, rpm and m/s.
 * @returns the wheel, not held by the rack; null until diameter when new, width and hole are known.
 * @source entered
 * @example typedWheelData({ ...wheel, diameterNewMm: 25, diameterNowMm: null })?.diameterNowMm // 25
 */
export function typedWheelData(typed: TypedWheel): WheelData | null {
  const { diameterNewMm, widthMm, holeMm } = typed;
  if (diameterNewMm === null || widthMm === null || holeMm === null) return null;
  return {
    ...typed,
    diameterNewMm,
    diameterNowMm: typed.diameterNowMm ?? diameterNewMm,
    widthMm,
    holeMm,
    mounted: null,
    expiresOn: null,
    state: 'on the rack',
    setAsideReason: null,
  };
}

/** What a setup names, as it was found (null where it was not), and what the shop adds to every plan. */
export interface Found {
  lathe: LatheData | null;
  grinder: GrinderData | null;
  quill: QuillData | null;
  wheel: WheelData | null;
  rules: ShopRules;
  /** The shop's own date, ISO. */
  today: string;
}

/**
 * Fills the machines and the wheel that a setup names into its inputs, ready for planSetup.
 *
 * @param inputs - the setup as stored.
 * @param found - machines and wheel by the ids in the inputs, the shop's rules and date.
 * @returns all that the rules read; a typed wheel goes before one from the rack.
 * @source entered
 * @example assemblePlanInput(planInput, { lathe, grinder, quill, wheel, rules, today: '2026-03-02' }).wheelData?.marking // 'A 60 K 7 V'
 */
export function assemblePlanInput(inputs: SetupInputs, found: Found): PlanInput {
  const { typed } = inputs.wheel;
  const { wheel, ...rest } = found;
  return { ...inputs, ...rest, wheelData: typed === null ? wheel : typedWheelData(typed) };
}
