/** Kalpakjian and Schmid, Manufacturing Engineering and Technology: grinding. */
import { contactLength, equivalentDiameter, removalRate } from '@/shared/rules/contact';
import { specificEnergy } from '@/shared/rules/energy';
import { stated } from '@/shared/rules/figures';
import { grindingPower, tangentialForce } from '@/shared/rules/force';
import { wheelSpeed } from '@/shared/rules/speed';
import { convertUnit } from '@/shared/units/entry-units';

const inch = (value: number) => convertUnit(value, 'in', 'mm');

describe('Kalpakjian, worked example on forces in surface grinding', () => {
  // A 10 in wheel at 4 000 rpm, 1 in wide, 0.002 in deep, work at 60 in/min, 15 hp min/in3.
  const removal = removalRate(inch(1) / Math.PI, inch(0.002), inch(60));
  const energy = stated('specific energy', [convertUnit(15, 'hp·min/in3', 'J/mm3'), 'J/mm3']);
  const power = grindingPower(energy, removal);

  it('removes 0.12 in3/min', () => {
    expect(convertUnit(removal.value ?? NaN, 'mm3/s', 'in3/min')).toBeCloseTo(0.12, 9);
  });

  it('takes 1.8 hp', () => {
    expect(convertUnit(power.value ?? NaN, 'W', 'hp')).toBeCloseTo(1.8, 9);
  });

  it('presses along the rim with 5.67 lb', () => {
    const force = tangentialForce(power, wheelSpeed(inch(10), 4000)).value ?? NaN;
    expect(convertUnit(force, 'N', 'lbf')).toBeCloseTo(5.67, 2);
  });
});

describe('Kalpakjian, table of specific energy', () => {
  it('puts 10 hp min/in3 at 27.3 J/mm3', () => {
    expect(convertUnit(10, 'hp·min/in3', 'J/mm3')).toBeCloseTo(27.3, 1);
  });

  it.each([
    ['aluminium-alloy', 7, 27, 14],
    ['cast-iron', 12, 60, 27],
    ['plain-carbon-annealed', 14, 68, 31],
    ['tool-hardened', 18, 82, 38],
  ] as const)('gives %s %d to %d J/mm3', (material, low, high, mean) => {
    const energy = specificEnergy(material);
    expect(energy.band).toEqual({ low, high });
    expect(energy.value).toBeCloseTo(mean, 0);
  });
});

describe('Kalpakjian, worked example on contact length (values from memory)', () => {
  it('finds 3.2 mm for a 200 mm wheel 0.05 mm deep on flat work', () => {
    const length = contactLength(0.05, equivalentDiameter(200, 1e12, 'outside')).value ?? NaN;
    expect(Math.abs(length - 3.2)).toBeLessThan(0.05);
  });
});
