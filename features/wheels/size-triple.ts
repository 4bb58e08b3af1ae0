import { readEntry } from '@/features/forms';
import type { UnitSystem } from '@/shared/domain/people';

import { WHEEL_FIELDS } from './fields';

/** The three sizes of a label, in the order they stand there. */
export const SIZE_FIELDS = ['diameterNewMm', 'widthMm', 'holeMm'] as const;

const BETWEEN = /\s*[x×*]\s*/i;
const UNIT_AT_END = /\s*(mm|in|inch|")$/i;

/**
 * "25 x 20 x 8" as three texts, diameter, width and hole; a unit behind the last counts for all. Null where it is
 * not three sizes that can be read.
 */
export function readSizes(text: string, units: UnitSystem): string[] | null {
  const parts = text.trim().split(BETWEEN);
  const unit = UNIT_AT_END.exec(parts.at(-1) ?? '')?.[0].trim() ?? '';
  const sizes = parts.map((part) => (UNIT_AT_END.test(part) || !unit ? part : `${part} ${unit}`));
  const isRead = SIZE_FIELDS.every(
    (field, index) => readEntry(sizes[index] ?? '', WHEEL_FIELDS[field], units).si !== null,
  );
  return sizes.length === SIZE_FIELDS.length && isRead ? sizes : null;
}
