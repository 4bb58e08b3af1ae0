import { diamondSizesUp, smallestDiamond } from '@/shared/rules/diamond';
import { parseMarking, type WheelMarking } from '@/shared/rules/marking';

const INCH = 25.4;
const gentle = { marking: null, dry: false, wheelMPerS: null };

function mark(text: string): WheelMarking {
  const parsed = parseMarking(text);
  if (!parsed.ok) throw new Error(text);
  return parsed.marking;
}

const stone = (diameterIn: number, widthIn: number) =>
  smallestDiamond(diameterIn * INCH, widthIn * INCH, gentle).value;

describe('the smallest diamond', () => {
  it('changes just beyond each index of the table', () => {
    const table: [number, number][] = [
      [3, 0.25],
      [6, 0.35],
      [10, 0.5],
      [15, 0.6],
      [21, 0.75],
      [30, 1],
      [48, 1.25],
      [65, 1.5],
      [80, 1.75],
      [100, 2],
      [150, 2.5],
      [200, 3],
      [260, 3.5],
      [350, 4],
    ];
    table.forEach(([index, carats], row) => {
      expect(stone(index, 1)).toBe(carats);
      expect(stone(index + 0.01, 1)).toBe(table[row + 1]?.[1] ?? null);
    });
  });

  it('is the least stone for the smallest wheels', () => {
    expect(stone(0.5, 0.25)).toBe(0.25);
  });

  it('is not known without sizes', () => {
    expect(smallestDiamond(null, 25, gentle).value).toBeNull();
    expect(smallestDiamond(200, null, gentle).value).toBeNull();
  });

  it('is not read beyond the largest stone of the table', () => {
    expect(smallestDiamond(350 * INCH, INCH, { ...gentle, dry: true }).value).toBeNull();
  });
});

describe('sizes up', () => {
  it.each([
    ['A 60 K 8 V', false, 25, 0],
    ['A 60 K 8 V', true, 25, 1],
    ['A 46 M 8 V', false, 33.02, 0],
    ['A 36 M 8 V', false, 33.02, 1],
    ['A 46 N 8 V', false, 33.03, 1],
    ['A 36 N 8 V', true, 25, 2],
    ['C 46 M 8 V', false, 25, 1],
    ['GC 36 N 8 V', true, 40, 3],
    ['D126 R100 B', true, 25, 1],
  ])('for %s, dry %s at %d m/s are %d', (text, dry, wheelMPerS, sizes) => {
    expect(diamondSizesUp({ marking: mark(text), dry, wheelMPerS })).toBe(sizes);
  });
});
