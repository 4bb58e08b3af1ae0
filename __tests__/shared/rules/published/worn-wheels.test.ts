import { planSetup } from '@/shared/rules';
import { wornWheels } from '@/shared/rules/published/worn-wheels';

import { outsideInput } from '../../../support/plan-inputs';
import { checkPublished } from '../../../support/published';

checkPublished(wornWheels);

describe('a plan with a worn wheel', () => {
  const input = outsideInput();
  const { limits } = planSetup({
    ...input,
    wheelData: input.wheelData && {
      ...input.wheelData,
      diameterNewMm: 150,
      diameterNowMm: 120,
      markedRpm: 4456,
      markedSpeedMPerS: null,
    },
  });

  it('keeps the marked 4 456 rpm as its limit', () => {
    expect(limits.governing?.kind).toBe('marked rpm');
    expect(limits.governing?.rpm.value).toBe(4456);
  });

  it('is offered nothing faster: its working only mentions that some laws would', () => {
    expect(limits.all.filter(({ kind }) => kind.startsWith('marked'))).toHaveLength(1);
    expect(limits.governing?.rpm.working.note).toMatch(/Some laws/);
  });
});
