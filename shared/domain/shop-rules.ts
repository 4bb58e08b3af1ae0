/**
 * The values a shop may set for itself. Each starts at the default of rules recalled from memory or common
 * practice, and says so in every working that uses it.
 */
export interface ShopRules {
  /** Stiffness of post and slides where the grinder's own was not measured, N/mm. */
  assumedPostStiffnessNPerMm: number;
  /** The most the sprung quill may lag in the steady state, mm. */
  lagLimitMm: number;
  /** Share of the motor's power that a plan may use. */
  powerShare: number;
  /** Share of the first bending frequency at which a quill may turn: computed, and measured. */
  computedFrequencyShare: number;
  measuredFrequencyShare: number;
  /** Largest rough infeed on a tool-post grinder, mm on radius. */
  roughInfeedLimitMm: number;
  /** Finish infeed aimed at, mm on radius. */
  finishInfeedMm: number;
  /** Stock left for finishing, mm on radius. */
  finishStockMm: number;
  /** Largest traverse per work revolution as a share of the wheel's width. */
  roughTraverseShare: number;
  finishTraverseShare: number;
  /** Overlap ratio of dressing. */
  roughDressOverlap: number;
  finishDressOverlap: number;
  /** Depth of a dressing pass, mm on the wheel's radius, and how many. */
  roughDressDepthMm: number;
  finishDressDepthMm: number;
  roughDressPasses: number;
  finishDressPasses: number;
  /** Diamond's tip radius where it is not known, mm. */
  assumedTipRadiusMm: number;
  /** Volume ground over wheel volume worn. */
  grindingRatio: number;
  /** Tangential over normal force. */
  forceRatio: number;
  /** How many times as fast as the work the wheel usually runs. */
  speedRatioLow: number;
  speedRatioHigh: number;
  /** Expansion of steel for each kelvin. */
  steelExpansionPerK: number;
  /** Metal taken beyond clean-up on jaws, mm on radius. */
  jawAllowanceMm: number;
  /** Trial run after a wheel change, and each day, minutes. */
  trialRunMinutes: number;
  dailyTrialRunMinutes: number;
}

export const DEFAULT_SHOP_RULES: ShopRules = {
  assumedPostStiffnessNPerMm: 5000,
  lagLimitMm: 0.015,
  powerShare: 0.8,
  computedFrequencyShare: 0.5,
  measuredFrequencyShare: 0.75,
  roughInfeedLimitMm: 0.0125,
  finishInfeedMm: 0.005,
  finishStockMm: 0.02,
  roughTraverseShare: 1 / 8,
  finishTraverseShare: 1 / 16,
  roughDressOverlap: 3,
  finishDressOverlap: 6,
  roughDressDepthMm: 0.025,
  finishDressDepthMm: 0.0125,
  roughDressPasses: 3,
  finishDressPasses: 2,
  assumedTipRadiusMm: 0.38,
  grindingRatio: 20,
  forceRatio: 0.4,
  speedRatioLow: 40,
  speedRatioHigh: 120,
  steelExpansionPerK: 11.5e-6,
  jawAllowanceMm: 0.025,
  trialRunMinutes: 3,
  dailyTrialRunMinutes: 1,
};
