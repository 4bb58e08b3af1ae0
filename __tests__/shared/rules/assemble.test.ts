import { createSetupRequest } from '@/shared/contracts/setups';
import { OPERATIONS } from '@/shared/domain/setups';
import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import { assemblePlanInput, emptySetupInputs, typedWheelData } from '@/shared/rules';

import { LATHE, SMALL_WHEEL, TODAY } from '../../support/plan-inputs';

const TYPED = {
  marking: 'A 60 K 7 V',
  diameterNewMm: 25,
  diameterNowMm: null,
  widthMm: 12,
  holeMm: 6,
  markedRpm: 24_000,
  markedSpeedMPerS: null,
  markingReadOn: 'box' as const,
  looked: null,
  rung: null,
};
const found = {
  lathe: LATHE,
  grinder: null,
  quill: null,
  wheel: SMALL_WHEEL,
  rules: DEFAULT_SHOP_RULES,
  today: TODAY,
};

describe('empty inputs', () => {
  it.each(OPERATIONS)('are what the contract takes: %s', (operation) => {
    const parsed = createSetupRequest.safeParse({
      id: '0190a1b2-0000-7000-8000-000000000001',
      name: 'Draft',
      inputs: emptySetupInputs(operation),
      typed: {},
    });
    expect(parsed.error?.issues).toBeUndefined();
  });
});

describe('a wheel that is typed in', () => {
  it('is taken as new until its diameter now is given', () => {
    expect(typedWheelData(TYPED)).toMatchObject({
      diameterNowMm: 25,
      state: 'on the rack',
      mounted: null,
    });
    expect(typedWheelData({ ...TYPED, diameterNowMm: 23 })?.diameterNowMm).toBe(23);
  });

  it.each(['diameterNewMm', 'widthMm', 'holeMm'] as const)(
    'is not known without its %s',
    (name) => {
      expect(typedWheelData({ ...TYPED, [name]: null })).toBeNull();
    },
  );

  it('goes before one from the rack', () => {
    const inputs = emptySetupInputs('bore');
    expect(assemblePlanInput(inputs, found).wheelData).toBe(SMALL_WHEEL);
    const typed = { ...inputs, wheel: { wheelId: null, typed: TYPED } };
    expect(assemblePlanInput(typed, found).wheelData?.diameterNewMm).toBe(25);
    const unfinished = { ...inputs, wheel: { wheelId: 'x', typed: { ...TYPED, holeMm: null } } };
    expect(assemblePlanInput(unfinished, found).wheelData).toBeNull();
  });
});
