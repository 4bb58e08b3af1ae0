import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import { planSetup } from '@/shared/rules';
import { isShopSetting, SHOP_SETTINGS } from '@/shared/rules/shop-settings';
import { SOURCES } from '@/shared/rules/sources';

import { outsideInput, withWork } from '../../support/plan-inputs';

describe("a shop's own values", () => {
  it('each say what they are and where their default comes from', () => {
    expect(Object.keys(SHOP_SETTINGS).sort()).toEqual(Object.keys(DEFAULT_SHOP_RULES).sort());
    for (const { label, source } of Object.values(SHOP_SETTINGS)) {
      expect(label).not.toBe('');
      expect(SOURCES[source].title).not.toBe('');
    }
    expect(isShopSetting('memory-tip-radius')).toBe(true);
    expect(isShopSetting('memory-grade-words')).toBe(false);
  });

  it('take the place of the default in the plan, and say so in its workings', () => {
    const base = withWork(outsideInput(), { warmerK: 10 });
    const plan = planSetup({
      ...base,
      rules: {
        ...base.rules,
        roughDressDepthMm: 0.01,
        finishDressPasses: 4,
        steelExpansionPerK: 12e-6,
        speedRatioHigh: 50,
      },
    });
    expect(plan.dressing?.rough.depth.value).toBe(0.01);
    expect(plan.dressing?.rough.depth.working.terms[0]?.assumed).toBe(true);
    expect(plan.dressing?.finish.passes).toBe(4);
    expect(plan.measuring.shrinkage.value).toBeCloseTo(40 * 10 * 12e-6, 12);
    expect(plan.findings.map(({ code }) => code)).toContain('speed-ratio-high');
    expect(planSetup(base).findings).toEqual([]);
  });
});
