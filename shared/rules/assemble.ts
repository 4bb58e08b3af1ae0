import type { GrinderData, LatheData, QuillData } from '../domain/machines';
import type { PlanInput, SetupInputs, TypedWheel } from '../domain/setups';
import type { ShopRules } from '../domain/shop-rules';
import type { WheelData } from '../domain/wheels';

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
    smallestUsableMm: null,
    expiresOn: null,
    state: 'on the rack',
    setAsideReason: null,
    unsigned: false,
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
