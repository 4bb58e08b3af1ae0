import fc from 'fast-check';

import {
  contactLength,
  equivalentChip,
  equivalentDiameter,
  grindingRatio,
  plungeRemovalRate,
  removalRate,
  specificRemoval,
  wheelWear,
} from '@/shared/rules/contact';

const size = fc.double({ min: 1, max: 500, noNaN: true });

describe('the equivalent diameter', () => {
  it('lies under the wheel outside, over it inside, and at it on flat work', () => {
    expect(equivalentDiameter(100, 100, 'outside').value).toBe(50);
    expect(equivalentDiameter(25, 50, 'inside').value).toBe(50);
    expect(equivalentDiameter(100, 1e12, 'outside').value).toBeCloseTo(100, 6);
  });

  it('is not there when the wheel does not go into the bore', () => {
    expect(equivalentDiameter(50, 50, 'inside').value).toBeNull();
    expect(equivalentDiameter(51, 50, 'inside').value).toBeNull();
    expect(equivalentDiameter(49.999, 50, 'inside').value).toBeGreaterThan(0);
    expect(equivalentDiameter(50, 50, 'outside').value).toBe(25);
  });

  it('gives the length over which two circles overlap by the infeed', () => {
    fc.assert(
      fc.property(size, size, (wheel, work) => {
        fc.pre(wheel < 0.9 * work);
        const infeed = 1e-6 * wheel;
        const [rs, rw] = [wheel / 2, work / 2];
        const apart = rw - rs + infeed;
        const along = (apart ** 2 + rw ** 2 - rs ** 2) / (2 * apart);
        const chord = Math.sqrt(rw ** 2 - along ** 2);
        const length = contactLength(infeed, equivalentDiameter(wheel, work, 'inside')).value;
        return Math.abs((length ?? NaN) / chord - 1) < 1e-2;
      }),
    );
  });
});

describe('removal', () => {
  it('is the volume of the ring taken off while the wheel travels', () => {
    const [diameter, infeed, traverse] = [40, 0.01, 120];
    const ring = (Math.PI / 4) * (diameter ** 2 - (diameter - 2 * infeed) ** 2) * (traverse / 60);
    expect(removalRate(diameter, infeed, traverse).value).toBeCloseTo(ring, 2);
  });

  it('in a plunge is the ring of one turn, turns a second', () => {
    const plunge = { workMm: 40, widthMm: 10, infeedMmPerRev: 0.005, workRpm: 120 };
    const ring = (Math.PI / 4) * (40 ** 2 - (40 - 0.01) ** 2) * 10 * 2;
    expect(plungeRemovalRate(plunge).value).toBeCloseTo(ring, 2);
  });

  it('is not known while a part of it is not', () => {
    expect(removalRate(null, 0.01, 120).value).toBeNull();
    expect(specificRemoval(0.01, null).value).toBeNull();
    expect(equivalentChip(0.01, 15, 0).value).toBeNull();
  });

  it('keeps the same volume through the contact', () => {
    const chip = equivalentChip(0.012, 18, 25).value ?? NaN;
    expect(chip * 25 * 1000).toBeCloseTo(specificRemoval(0.012, 18).value ?? NaN, 9);
  });
});

describe('wheel wear', () => {
  it('takes from the wheel the volume that the grinding ratio says', () => {
    const pass = {
      infeedMm: 0.01,
      workMm: 40,
      lengthMm: 150,
      wheelMm: 100,
      widthMm: 20,
      ratio: 20,
    };
    const wear = wheelWear(pass).value ?? NaN;
    expect(grindingRatio(Math.PI * 40 * 0.01 * 150, Math.PI * 100 * wear * 20)).toBeCloseTo(20, 9);
  });

  it('has no ratio without wear', () => {
    expect(() => grindingRatio(10, 0)).toThrow(RangeError);
    expect(() => grindingRatio(10, Number.NaN)).toThrow(RangeError);
    expect(grindingRatio(0, 1)).toBe(0);
  });
});
