/** Machinery's Handbook, 31st ed., p. 1303, diamonds for truing. */
import { smallestDiamond } from '@/shared/rules/diamond';
import { parseMarking } from '@/shared/rules/marking';
import { convertUnit } from '@/shared/units/entry-units';

const plain = { marking: null, dry: false, wheelMPerS: null };

function stone(diameterIn: number, widthIn: number, mark?: string): number | null {
  const parsed = mark === undefined ? null : parseMarking(mark);
  const marking = parsed?.ok === true ? parsed.marking : null;
  const millimetres = (inches: number) => convertUnit(inches, 'in', 'mm');
  return smallestDiamond(millimetres(diameterIn), millimetres(widthIn), { ...plain, marking })
    .value;
}

describe("Machinery's Handbook 31, p. 1303", () => {
  it('asks for half a carat for a wheel of 8 by 1 in', () => {
    expect(stone(8, 1)).toBe(0.5);
  });

  it('asks for one carat for a wheel of 12 by 2.5 in', () => {
    expect(stone(12, 2.5)).toBe(1);
  });

  it('raises the same wheel in silicon carbide 36-P by two sizes, to one and a half', () => {
    expect(stone(12, 2.5, 'C 36 P V')).toBe(1.5);
  });

  it('puts 6 500 ft/min at 1 981 m/min', () => {
    expect(convertUnit(6500, 'ft/min', 'm/min')).toBeCloseTo(1981, 0);
  });
});
