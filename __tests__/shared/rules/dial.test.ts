import { compoundAngle, dialOf, settle, type Dial } from '@/shared/rules/dial';

import { LATHE } from '../../support/plan-inputs';

const metric: Dial = { divisionMm: 0.01, stepMm: 0.005, compoundDivisionMm: null };
const THOU = 0.0254;

describe('the dial', () => {
  it('moves half of what it is marked where it reads diameter', () => {
    expect(dialOf(LATHE)?.divisionMm).toBeCloseTo(0.005, 12);
    expect(dialOf({ ...LATHE, crossSlideReads: 'radius' })?.divisionMm).toBeCloseTo(0.01, 12);
    expect(dialOf(null)).toBeNull();
  });

  it('is set to half a division by eye', () => {
    expect(dialOf(LATHE)?.stepMm).toBeCloseTo(0.0025, 12);
  });
});

describe('setting an infeed', () => {
  it('rounds down to whole or half divisions', () => {
    expect(settle(0.0125, 0.05, metric)).toMatchObject({ infeedMm: 0.01, divisions: 1 });
    expect(settle(0.0149, 0.05, metric).infeedMm).toBeCloseTo(0.01, 12);
    expect(settle(0.016, 0.05, metric).divisions).toBeCloseTo(1.5, 12);
  });

  it('takes five tenths for five, though doubles make it 4.999', () => {
    const tenths: Dial = { divisionMm: 0.0001, stepMm: 0.00005, compoundDivisionMm: null };
    expect(settle(0.0005, 1, tenths).divisions).toBeCloseTo(5, 9);
    expect(
      settle(0.3 - 0.1, 1, { ...metric, divisionMm: 0.1, stepMm: 0.05 }).divisions,
    ).toBeCloseTo(2);
  });

  it('goes to the compound where half a division is too coarse', () => {
    const inch: Dial = { divisionMm: THOU, stepMm: THOU / 2, compoundDivisionMm: THOU };
    const setting = settle(0.005, 0.0127, inch);
    expect(setting.compoundAngle?.value).toBeCloseTo(5.739, 3);
    expect(setting.infeedMm).toBeCloseTo(THOU / 10, 9);
    expect(setting.divisions).toBeNull();
  });

  it('takes half a division and offers the compound where its division is not recorded', () => {
    const setting = settle(0.004, 0.0127, metric);
    expect(setting).toMatchObject({ infeedMm: 0.005, divisions: 0.5 });
    expect(setting.compoundAngle?.value).toBeGreaterThan(0);
  });

  it('never feeds above the ceiling: it keeps what was wanted, without divisions', () => {
    expect(settle(0.004, 0.0045, metric)).toMatchObject({ infeedMm: 0.004, divisions: null });
  });

  it('leaves the wanted infeed as it is without a dial', () => {
    expect(settle(0.0123, 0.05, null)).toMatchObject({ infeedMm: 0.0123, divisions: null });
  });
});

describe('the compound as a fine feed (Lautard; handbook)', () => {
  it('stands at 5 deg 44 min for a tenth of its division', () => {
    expect(compoundAngle(0.1, 1).value).toBeCloseTo(5 + 44 / 60, 1);
  });

  it('stands at 2 deg 52 min for a tenth on diameter', () => {
    expect(compoundAngle(0.05, 1).value).toBeCloseTo(2 + 52 / 60, 1);
  });

  it('is set finer still where both are too coarse', () => {
    expect(compoundAngle(0.01, 1).value).toBeCloseTo(0.573, 3);
  });
});
