/** Machinery's Handbook, 31st ed., p. 1318, table 3: cylindrical traverse grinding, as printed. */
import type { Material } from '@/shared/domain/materials';
import { workRow } from '@/shared/rules/work-table';

interface Row {
  material: Material;
  metresPerMin: number;
  decimals: number;
  roughInch: number;
  finishInch: [number, number];
  shares: [number, number];
}

const PRINTED: Row[] = [
  ['plain-carbon-annealed', 30.5, 1, 0.0005, 0.0005, 1 / 2, 1 / 6],
  ['plain-carbon-hardened', 21, 0, 0.0003, 0.0005, 1 / 4, 1 / 8],
  ['alloy-annealed', 30.5, 1, 0.0005, 0.0005, 1 / 2, 1 / 6],
  ['alloy-hardened', 21, 0, 0.0002, 0.0005, 1 / 4, 1 / 8],
  ['tool-annealed', 18, 0, 0.0005, 0.0005, 1 / 2, 1 / 6],
  ['tool-hardened', 15, 0, 0.0001, 0.0005, 1 / 4, 1 / 8],
  ['copper-alloy', 30.5, 1, 0.0005, 0.0005, 1 / 3, 1 / 6],
  ['aluminium-alloy', 45.7, 1, 0.0005, 0.0005, 1 / 3, 1 / 6],
].map(([material, metresPerMin, decimals, low, high, rough, finish]) => ({
  material: material as Material,
  metresPerMin: Number(metresPerMin),
  decimals: Number(decimals),
  roughInch: 0.002,
  finishInch: [Number(low), Number(high)],
  shares: [Number(rough), Number(finish)],
}));

describe("recommended work speed, infeed and traverse (Machinery's Handbook p. 1318; handbook)", () => {
  it.each(PRINTED)('is as printed for $material', (row) => {
    const table = workRow(row.material);
    expect(table.workSpeedMPerMin).toBeCloseTo(row.metresPerMin, row.decimals);
    expect(table.roughInfeedMm / 25.4).toBeCloseTo(row.roughInch, 9);
    expect(table.finishInfeedMm.low / 25.4).toBeCloseTo(row.finishInch[0], 9);
    expect(table.finishInfeedMm.high / 25.4).toBeCloseTo(row.finishInch[1], 9);
    expect(table.roughTraverseShare).toBeCloseTo(row.shares[0], 9);
    expect(table.finishTraverseShare).toBeCloseTo(row.shares[1], 9);
  });

  it('treats cast iron and stainless as plain carbon steel, annealed (value from memory)', () => {
    for (const material of ['cast-iron', 'stainless'] as const) {
      expect(workRow(material).workSpeedMPerMin).toBeCloseTo(30.5, 1);
      expect(workRow(material).source).toBe('memory-materials');
    }
  });
});
