import fc from 'fast-check';

import { MATERIALS } from '@/shared/domain/materials';
import { equivalentDiameter, removalRate } from '@/shared/rules/contact';
import {
  burnFindings,
  burnThreshold,
  deepestWithoutBurn,
  specificEnergy,
} from '@/shared/rules/energy';
import { stated } from '@/shared/rules/figures';
import { grindingPower, normalForce, tangentialForce } from '@/shared/rules/force';

describe('specific energy', () => {
  it.each(MATERIALS)('of %s lies inside its band', (material) => {
    const { value, band } = specificEnergy(material);
    expect(value).toBeGreaterThan(band?.low ?? Infinity);
    expect(value).toBeLessThan(band?.high ?? 0);
  });

  it('is not known without a material', () => {
    expect(specificEnergy(null).value).toBeNull();
    expect(specificEnergy(null).band).toBeUndefined();
  });

  it('says where the table has no row of its own', () => {
    const assumed = (material: (typeof MATERIALS)[number]) =>
      specificEnergy(material).working.terms.every((term) => term.assumed === true);
    expect(MATERIALS.filter((material) => !assumed(material))).toEqual([
      'plain-carbon-annealed',
      'tool-hardened',
      'cast-iron',
      'aluminium-alloy',
    ]);
    expect(specificEnergy('stainless').working.source).toBe('memory-energy-assumed');
  });
});

describe('the burning threshold', () => {
  const diameter = equivalentDiameter(25, 50, 'inside');

  it('falls with the infeed and with the work speed', () => {
    const size = fc.double({ min: 0.0005, max: 0.05, noNaN: true });
    const speed = fc.double({ min: 3, max: 60, noNaN: true });
    fc.assert(
      fc.property(size, speed, (infeed, work) => {
        const here = burnThreshold(diameter, infeed, work).value ?? NaN;
        const deeper = burnThreshold(diameter, infeed * 1.1, work).value ?? NaN;
        const faster = burnThreshold(diameter, infeed, work * 1.1).value ?? NaN;
        return deeper < here && faster < here && here > 6.2;
      }),
    );
  });

  it('is met exactly at the deepest infeed without burning', () => {
    const energy = fc.double({ min: 8, max: 120, noNaN: true });
    fc.assert(
      fc.property(energy, fc.double({ min: 3, max: 60, noNaN: true }), (u, work) => {
        const infeed = deepestWithoutBurn(u, 50, work);
        const threshold = burnThreshold(stated('d', [50, 'mm']), infeed, work).value ?? NaN;
        return Math.abs(threshold / u - 1) < 1e-9;
      }),
    );
  });

  it('is never met by energies under its constant', () => {
    expect(deepestWithoutBurn(6.2, 50, 15)).toBeNull();
    expect(deepestWithoutBurn(null, 50, 15)).toBeNull();
    expect(deepestWithoutBurn(30, null, 15)).toBeNull();
  });

  it('is a check above it with a free-cutting wheel, a note with an ordinary one, else nothing', () => {
    const energy = specificEnergy('tool-hardened');
    const codes = (threshold: number) =>
      burnFindings(energy, stated('u_c', [threshold, 'J/mm3']), 0.01).map(({ code, level }) => [
        code,
        level,
      ]);
    expect(codes(17.9)).toEqual([['burn-likely', 'check']]);
    expect(codes(18)).toEqual([['burn-possible', 'note']]);
    expect(codes(38.4)).toEqual([['burn-possible', 'note']]);
    expect(codes(38.5)).toEqual([]);
  });
});

describe('force and power', () => {
  const power = grindingPower(specificEnergy('tool-hardened'), removalRate(40, 0.01, 120));
  const along = tangentialForce(power, stated('v', [25, 'm/s']));
  const across = normalForce(along, 0.4);

  it('carry the band of the energy', () => {
    for (const figure of [power, along, across]) {
      expect((figure.band?.low ?? NaN) / (figure.value ?? NaN)).toBeCloseTo(18 / 38.4187, 4);
      expect((figure.band?.high ?? NaN) / (figure.value ?? NaN)).toBeCloseTo(82 / 38.4187, 4);
    }
  });

  it('follow from one another', () => {
    expect((along.value ?? NaN) * 25).toBeCloseTo(power.value ?? NaN, 9);
    expect((across.value ?? NaN) * 0.4).toBeCloseTo(along.value ?? NaN, 9);
  });

  it('are not known when something is missing or the wheel stands still', () => {
    expect(grindingPower(specificEnergy(null), removalRate(40, 0.01, 120)).value).toBeNull();
    expect(tangentialForce(power, stated('v', [0, 'm/s'])).value).toBeNull();
    expect(normalForce(along, null).value).toBeNull();
  });
});
