import type { ShopRules } from '../domain/shop-rules';
import type { UnitName } from '../units/unit';
import type { SourceId } from './sources';

/** A value that a shop may set for itself: what it is called, and where its default comes from. */
export interface ShopSetting {
  label: string;
  unit: UnitName;
  source: SourceId;
  /**
   * Which way is the stricter; a shop may go no other. Null for estimates, which may turn out either way once they
   * are measured.
   */
  stricter: 'less' | 'more' | null;
}

/** Every setting, in the order in which a lead reads them. */
export const SHOP_SETTINGS: Record<keyof ShopRules, ShopSetting> = {
  computedFrequencyShare: setting(
    'Share of a computed bending frequency',
    ['1', 'less'],
    'memory-quill-share',
  ),
  measuredFrequencyShare: setting(
    'Share of a measured bending frequency',
    ['1', 'less'],
    'memory-quill-share',
  ),
  trialRunMinutes: setting('Trial run after a wheel change', ['min', 'more'], 'japan-118'),
  dailyTrialRunMinutes: setting('Trial run each day', ['min', 'more'], 'japan-118'),
  roughInfeedLimitMm: setting(
    'Largest rough infeed, on radius',
    ['mm', 'less'],
    'practice-interrupted',
  ),
  finishInfeedMm: setting('Finish infeed, on radius', ['mm', 'less'], 'practice-schedule'),
  lagLimitMm: setting('Most that the sprung quill may lag', ['mm', 'less'], 'memory-finish-stock'),
  powerShare: setting("Share of the motor's power", ['1', 'less'], 'kalpakjian-force'),
  roughTraverseShare: setting(
    'Traverse, rough: share of the wheel',
    ['1', 'less'],
    'memory-traverse-share',
  ),
  finishTraverseShare: setting(
    'Traverse, finish: share of the wheel',
    ['1', 'less'],
    'memory-traverse-share',
  ),
  speedRatioLow: setting('Lowest usual speed ratio', ['1', 'more'], 'memory-speed-ratio'),
  speedRatioHigh: setting('Highest usual speed ratio', ['1', 'less'], 'memory-speed-ratio'),
  finishStockMm: setting('Left for finishing, on radius', ['mm', null], 'memory-finish-stock'),
  jawAllowanceMm: setting('Taken beyond clean-up on jaws', ['mm', null], 'practice-jaw-clean-up'),
  roughDressDepthMm: setting('Dressing depth, rough', ['mm', 'less'], 'memory-dress-depth'),
  finishDressDepthMm: setting('Dressing depth, fine', ['mm', 'less'], 'memory-dress-depth'),
  roughDressPasses: setting('Dressing passes, rough', ['passes', null], 'memory-dress-depth'),
  finishDressPasses: setting('Dressing passes, fine', ['passes', null], 'memory-dress-depth'),
  roughDressOverlap: setting('Overlap of dressing, rough', ['1', null], 'memory-dress-overlap'),
  finishDressOverlap: setting('Overlap of dressing, fine', ['1', null], 'memory-dress-overlap'),
  assumedTipRadiusMm: setting("Diamond's tip radius", ['mm', null], 'memory-tip-radius'),
  assumedPostStiffnessNPerMm: setting(
    'Stiffness of post and slides',
    ['N/mm', null],
    'memory-post-stiffness',
  ),
  forceRatio: setting('Force along over force across', ['1', null], 'memory-force-ratio'),
  grindingRatio: setting(
    'Work ground away for each volume of wheel',
    ['1', null],
    'memory-grinding-ratio',
  ),
  steelExpansionPerK: setting(
    'Expansion of steel for each degree',
    ['1', null],
    'memory-expansion',
  ),
};

function setting(
  label: string,
  [unit, stricter]: [UnitName, ShopSetting['stricter']],
  source: SourceId,
): ShopSetting {
  return { label, unit, source, stricter };
}

/**
 * Whether a source's value is one that the shop can set for itself.
 *
 * @param source - where a value comes from.
 * @returns true where a setting rests on it.
 * @source none: it is read off the settings
 * @example isShopSetting('memory-tip-radius') // true
 */
export function isShopSetting(source: SourceId): boolean {
  return Object.values(SHOP_SETTINGS).some((known) => known.source === source);
}
