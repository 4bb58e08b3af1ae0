import * as yup from 'yup';

import { LIMITS, type LimitName } from '@/shared/domain/limits';
import type { UnitSystem } from '@/shared/domain/people';
import { displayUnit, unitLabel, type EntryUnit } from '@/shared/units/entry-units';
import { formatQuantity } from '@/shared/units/format';
import { parseQuantity } from '@/shared/units/parse';
import type { UnitName } from '@/shared/units/unit';

/** A number that a person types: its name, the unit it is kept in, and the range it may lie in. */
export interface QuantitySpec {
  label: string;
  hint?: string;
  unit: UnitName;
  limit: LimitName;
  /** Counts: no fractions. */
  whole?: boolean;
  /** The unit of a number without one; the person's own when left out. */
  bare?: EntryUnit;
}

export type Entry = { si: number; error?: undefined } | { si: null; error?: string };

/** "0.5 to 300 mm": limits are rounded inwards, so that both ends are accepted. */
function rangeWords({ unit, limit }: QuantitySpec, system: UnitSystem): string {
  const { min, max } = LIMITS[limit];
  const low = formatQuantity({ value: min, unit }, system, { rounding: 'up', withUnit: false });
  const high = formatQuantity({ value: max, unit }, system, { rounding: 'down' });
  return `${low} to ${high}`;
}

/** What a field says before anything goes wrong. */
export function quantityHint(spec: QuantitySpec, system: UnitSystem): string {
  const range = rangeWords(spec, system);
  return spec.hint ? `${spec.hint} ${range}.` : range;
}

function unreadableWords(spec: QuantitySpec, system: UnitSystem): string {
  if (spec.whole) return `${spec.label} is a whole number, ${rangeWords(spec, system)}.`;
  const unit = unitLabel(spec.unit, system);
  const examples = spec.unit === 'mm' ? 'like 32, 1 1/4 in or 0,5 mm' : `in ${unit || 'figures'}`;
  return `${spec.label} is a number, ${examples}.`;
}

/** Reads one field. Empty is no error here: whether a field may stay empty is the form's business. */
export function readEntry(text: string, spec: QuantitySpec, system: UnitSystem): Entry {
  const parsed = parseQuantity(text, spec.unit, spec.bare ?? displayUnit(spec.unit, system));
  if (!parsed.ok) {
    if (parsed.reason === 'empty') return { si: null };
    if (parsed.reason === 'wrong unit')
      return { si: null, error: `${spec.label} is given in ${unitLabel(spec.unit, system)}.` };
    if (parsed.reason === 'ambiguous')
      return {
        si: null,
        error: `${spec.label} can be read in two ways. Leave out the mark between thousands.`,
      };
    return { si: null, error: unreadableWords(spec, system) };
  }
  const { min, max } = LIMITS[spec.limit];
  if (parsed.value < min || parsed.value > max)
    return { si: null, error: `${spec.label} is from ${rangeWords(spec, system)}.` };
  if (spec.whole && !Number.isInteger(parsed.value))
    return { si: null, error: unreadableWords(spec, system) };
  return { si: parsed.value };
}

interface QuantityRule {
  spec: QuantitySpec;
  system: UnitSystem;
  required?: boolean;
}

/** The yup rule of one typed quantity; its words are those of readEntry. */
export function quantityText({ spec, system, required = false }: QuantityRule) {
  return yup
    .string()
    .default('')
    .test('quantity', (text = '', context) => {
      const entry = readEntry(text, spec, system);
      if (entry.error) return context.createError({ message: entry.error });
      if (required && entry.si === null)
        return context.createError({
          message: `Enter ${lowerFirst(spec.label)}: ${rangeWords(spec, system)}.`,
        });
      return true;
    });
}

const lowerFirst = (words: string) => words.charAt(0).toLowerCase() + words.slice(1);
