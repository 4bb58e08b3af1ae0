/** Modern Grinding Technology (web handbook), "Dresser overlays". */
import { dressLead, dressTraverse, dressWidth } from '@/shared/rules/dressing';
import { stated } from '@/shared/rules/figures';

describe('Modern Grinding Technology, "Dresser overlays"', () => {
  it('gives a dressing width of 0.273 mm for a tip of 0.38 mm at 0.025 mm, within 1.2 %', () => {
    const width = dressWidth(0.38, 0.025, false).value ?? NaN;
    expect(Math.abs(width / 0.273 - 1)).toBeLessThan(0.012);
    expect(width).toBeCloseTo(0.2711, 4);
  });

  it.each([
    [2, 192.5],
    [4, 96.25],
  ])('gives a traverse for 0.273 mm, 1 410 rpm and an overlap of %d', (overlap, mmPerMin) => {
    const lead = dressLead(stated('width', [0.273, 'mm']), overlap);
    const traverse = dressTraverse(lead, stated('spindle speed', [1410, 'rpm'])).value ?? NaN;
    expect(Math.abs(traverse - mmPerMin)).toBeLessThan(0.05);
  });
});
