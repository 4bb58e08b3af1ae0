/** Hong Kong Cap. 59L reg. 5(3) gives the figures; the strict laws keep the marked rpm for a worn wheel. */
import { planSetup } from '@/shared/rules';

import { outsideInput } from '../../../support/plan-inputs';

const worn = () => {
  const input = outsideInput();
  return {
    ...input,
    wheelData: input.wheelData && {
      ...input.wheelData,
      diameterNewMm: 150,
      diameterNowMm: 120,
      markedRpm: 4456,
      markedSpeedMPerS: null,
    },
  };
};

describe('a wheel marked 4 456 rpm at 150 mm, worn to 120 mm (Hong Kong Cap. 59L reg. 5(3); law)', () => {
  const { limits } = planSetup(worn());

  it('keeps 4 456 rpm as its limit', () => {
    expect(limits.governing?.kind).toBe('marked rpm');
    expect(limits.governing?.rpm.value).toBe(4456);
  });

  it('is offered nothing faster: its working only mentions that some laws would', () => {
    expect(limits.all.filter(({ kind }) => kind.startsWith('marked'))).toHaveLength(1);
    expect(limits.governing?.rpm.working.note).toMatch(/Some laws/);
  });
});
