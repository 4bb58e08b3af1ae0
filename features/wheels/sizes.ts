import type { UnitSystem } from '@/shared/domain/people';
import { unitLabel } from '@/shared/units/entry-units';
import { formatQuantity } from '@/shared/units/format';

const length = (value: number, units: UnitSystem) =>
  formatQuantity({ value, unit: 'mm' }, units, { withUnit: false });

/** "32 × 16 × 10 mm": diameter, width and hole. */
export function sizeWords(sizesMm: readonly number[], units: UnitSystem): string {
  const sizes = sizesMm.map((size) => length(size, units)).join(' × ');
  return `${sizes}\u00a0${unitLabel('mm', units)}`;
}
