import { useField } from 'formik';
import * as yup from 'yup';

import { quantityHint, readEntry, type QuantitySpec } from '@/features/forms';
import { Field } from '@/features/ui/field';
import type { UnitSystem } from '@/shared/domain/people';
import { unitLabel } from '@/shared/units/entry-units';
import { entryText, formatQuantity } from '@/shared/units/format';

/** A list of numbers as typed, one to a line or with semicolons between, and the values it stands for. */
export interface TypedList {
  text: string;
  si: number[] | null;
}

export const EMPTY_LIST: TypedList = { text: '', si: null };

/** As many as a lathe's table may hold. */
const MOST = 60;
const SPACED = /\d[\s\u00a0]+\d/;
const MIXED_NUMBER = /^\d+[\s-]\d+\/\d+/;
const HOW = 'Put each on a line of its own, or a semicolon between.';

export interface ListSpec extends QuantitySpec {
  /** Nothing at all is an answer. */
  optional?: boolean;
  /** The same value may stand more than once. */
  repeats?: boolean;
}

type Reading = { si: number[]; error?: undefined } | { si: null; error?: string };

/**
 * Reads a list. The comma is a decimal mark here and a space may stand between thousands, so neither can part two
 * numbers: where one of them seems to, the list is refused.
 */
export function readList(text: string, spec: ListSpec, units: UnitSystem): Reading {
  const items = text
    .split(/[\n;]+/)
    .map((item) => item.trim())
    .filter(Boolean);
  if (items.length === 0) return { si: null };
  if (items.length > MOST) return { si: null, error: `${spec.label}: at most ${MOST}.` };
  const values: number[] = [];
  for (const item of items) {
    if (/,\s/.test(item) || (SPACED.test(item) && !MIXED_NUMBER.test(item)))
      return { si: null, error: `"${item}" may be one number or several. ${HOW}` };
    const { si, error } = readEntry(item, spec, units);
    if (si === null) return { si: null, error: `"${item}" is not taken. ${error ?? HOW}` };
    values.push(si);
  }
  return { si: (spec.repeats ? values : [...new Set(values)]).sort((a, b) => a - b) };
}

export const typedList = (text: string, spec: ListSpec, units: UnitSystem): TypedList => ({
  text,
  si: readList(text, spec, units).si,
});

export const storedList = (si: readonly number[], spec: QuantitySpec, units: UnitSystem) => ({
  text: si.map((value) => entryText(value, spec.unit, units)).join('\n'),
  si: [...si],
});

export const listInUnits = (list: TypedList, spec: QuantitySpec, units: UnitSystem): TypedList =>
  list.si === null ? list : storedList(list.si, spec, units);

export function listRule(spec: ListSpec, units: UnitSystem) {
  return yup.mixed<TypedList>().test('list', (list, context) => {
    if (!list || list.si !== null || (spec.optional && list.text.trim() === '')) return true;
    const { error } = readList(list.text, spec, units);
    return context.createError({ message: error ?? `${spec.label}: enter one or more. ${HOW}` });
  });
}

/** What a list says in one line: "45; 70; 105 rpm". */
export function listWords(si: readonly number[], spec: QuantitySpec, units: UnitSystem): string {
  const values = si.map((value) =>
    formatQuantity({ value, unit: spec.unit }, units, { withUnit: false }),
  );
  return `${values.join('; ')}\u00a0${unitLabel(spec.unit, units)}`;
}

/** Lines of the field: room for the next number, without taking the screen. */
const SHOWN = { least: 4, most: 12 };

interface ListFieldProps {
  name: string;
  spec: ListSpec;
  units: UnitSystem;
}

/** Several numbers in one field; under it stands what was read from them. */
export function ListField({ name, spec, units }: ListFieldProps) {
  const [input, meta, helpers] = useField<TypedList>(name);
  const { text, si } = input.value;
  const read = si === null ? '' : ` Read as ${si.length}: ${listWords(si, spec, units)}.`;
  return (
    <Field
      name={name}
      label={spec.label}
      hint={`${spec.hint ? `${spec.hint} ` : ''}${HOW} Each ${quantityHint({ ...spec, hint: undefined }, units)}.${read}`}
      unit={unitLabel(spec.unit, units)}
      value={text}
      onChangeText={(next) => void helpers.setValue(typedList(next, spec, units))}
      onBlur={() => void helpers.setTouched(true)}
      error={meta.touched ? meta.error : undefined}
      lines={Math.min(SHOWN.most, Math.max(SHOWN.least, text.split('\n').length + 1))}
      required={!spec.optional}
    />
  );
}
