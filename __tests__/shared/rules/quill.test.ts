import {
  firstFrequency,
  quillLength,
  quillStiffness,
  quillTaper,
  taperFindings,
  wheelMassKg,
} from '@/shared/rules/quill';
import { effectiveQuill } from '@/shared/rules/mandrel';

import { QUILL, SMALL_WHEEL } from '../../support/plan-inputs';

const plain = (lengthMm: number, diameterMm: number) => ({
  ...QUILL,
  segments: [{ lengthMm, diameterMm }],
});

describe('the stiffness of a quill', () => {
  it('falls with the cube of the length and grows with the fourth power of the diameter', () => {
    const k = quillStiffness(plain(50, 10)).value ?? NaN;
    expect(quillStiffness(plain(100, 10)).value).toBeCloseTo(k / 8, 6);
    expect(quillStiffness(plain(50, 20)).value).toBeCloseTo(16 * k, 6);
  });

  it('is the same however one diameter is cut into segments', () => {
    const parts = {
      ...QUILL,
      segments: [20, 25, 15].map((lengthMm) => ({ lengthMm, diameterMm: 16 })),
    };
    expect(quillStiffness(parts).value).toBeCloseTo(quillStiffness(QUILL).value ?? NaN, 6);
    expect(quillLength(parts.segments)).toBe(60);
  });

  it('is almost three times as much in carbide', () => {
    const ratio =
      (quillStiffness({ ...QUILL, material: 'carbide' }).value ?? NaN) /
      (quillStiffness(QUILL).value ?? NaN);
    expect(ratio).toBeCloseTo(600 / 206, 6);
  });

  it('gives way to what was measured', () => {
    const measured = quillStiffness({ ...QUILL, measuredStiffnessNPerMm: 4000 });
    expect(measured.value).toBe(4000);
    expect(measured.working.source).toBe('entered');
  });

  it('is unknown without a quill', () => {
    expect(quillStiffness(null).value).toBeNull();
    expect(firstFrequency(null, 0.1).value).toBeNull();
    expect(firstFrequency(QUILL, null).value).toBeNull();
  });
});

describe('the mass of a wheel', () => {
  it('is 5.4 g for one of 25 by 5 by 0 mm at 2.2 g a cubic centimetre (value from memory)', () => {
    expect(1000 * wheelMassKg({ diameterNowMm: 25, widthMm: 5, holeMm: 0 })).toBeCloseTo(5.4, 2);
  });

  it('is never below nothing', () => {
    expect(wheelMassKg({ diameterNowMm: 5, widthMm: 5, holeMm: 10 })).toBe(0);
  });
});

describe('taper across the wheel', () => {
  it("is one and a half times the quill's bend times width over length (derived)", () => {
    const force = 20;
    const bend = force / (quillStiffness(QUILL).value ?? NaN);
    expect(quillTaper(QUILL, force, 12).value).toBeCloseTo((1.5 * bend * 12) / 60, 12);
  });

  it('is worth a word above a quarter of the tolerance, on diameter', () => {
    const taper = quillTaper(QUILL, 20, 12);
    const onDiameter = 2 * (taper.value ?? NaN);
    expect(taperFindings(taper, onDiameter * 4.01)).toEqual([]);
    expect(taperFindings(taper, onDiameter * 3.99)[0]?.code).toBe('quill-taper');
    expect(taperFindings(taper, null)).toEqual([]);
  });
});

describe('a mounted wheel', () => {
  const mounted = {
    ...SMALL_WHEEL,
    mounted: { mandrelDiameterMm: 6, overhangMm: 20, threaded: false, makerMaximumRpm: 30_000 },
  };

  it('bends on its mandrel, which makes the whole softer', () => {
    const together = effectiveQuill({ ...QUILL, measuredStiffnessNPerMm: 9000 }, mounted);
    expect(together?.segments[0]).toEqual({ lengthMm: 32, diameterMm: 6 });
    expect(together?.measuredStiffnessNPerMm).toBeNull();
    expect(quillStiffness(together).value).toBeLessThan(9000 / 4);
  });

  it('leaves a quill with a screwed-on wheel as it is', () => {
    expect(effectiveQuill(QUILL, SMALL_WHEEL)).toBe(QUILL);
    expect(effectiveQuill(null, mounted)).toBeNull();
  });
});
