import type { UnitSystem } from '@/shared/domain/people';
import { unitLabel } from '@/shared/units/entry-units';
import { formatQuantity } from '@/shared/units/format';

const length = (value: number, units: UnitSystem) =>
  formatQuantity({ value, unit: 'mm' }, units, { withUnit: false });

/** "32 × 16 × 10 mm": diameter, width and hole, never parted by the end of a line. */
export function sizeWords(
  sizesMm: readonly number[],
  { units, withUnit = true }: { units: UnitSystem; withUnit?: boolean },
): string {
  const sizes = sizesMm.map((size) => length(size, units)).join('\u00a0×\u00a0');
  return withUnit ? `${sizes}\u00a0${unitLabel('mm', units)}` : sizes;
}
