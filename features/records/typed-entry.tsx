import { useField } from 'formik';
import * as yup from 'yup';

import { QuantityInput, quantityText, readEntry, type QuantitySpec } from '@/features/forms';
import { UNIT_SYSTEMS, type UnitSystem } from '@/shared/domain/people';
import { entryText } from '@/shared/units/format';

/**
 * A quantity as it stands in a field: the text, and the value it stands for. Showing it in other units makes a
 * new text and leaves the value alone.
 */
export interface TypedEntry {
  text: string;
  /** Null where the text is empty, cannot be read, or is out of range. */
  si: number | null;
}

export const EMPTY_ENTRY: TypedEntry = { text: '', si: null };

export const typedEntry = (text: string, spec: QuantitySpec, units: UnitSystem): TypedEntry => ({
  text,
  si: readEntry(text, spec, units).si,
});

export const storedEntry = (
  si: number | null,
  spec: QuantitySpec,
  units: UnitSystem,
): TypedEntry => (si === null ? EMPTY_ENTRY : { text: entryText(si, spec.unit, units), si });

/** The same value in other units; what could not be read stays as it was typed. */
export const entryInUnits = (
  entry: TypedEntry,
  spec: QuantitySpec,
  units: UnitSystem,
): TypedEntry => (entry.si === null ? entry : storedEntry(entry.si, spec, units));

interface EntryRule {
  spec: QuantitySpec;
  units: UnitSystem;
  required?: boolean;
}

/** The yup rule of one entry, in the words of every other quantity field. */
function entryRule({ spec, units, required = false }: EntryRule) {
  const words = quantityText({ spec, system: units, required });
  return yup.mixed<TypedEntry>().test('entry', (entry, context) => {
    if (!entry || entry.si !== null) return true;
    try {
      words.validateSync(entry.text);
      return true;
    } catch (error) {
      return context.createError({ message: error instanceof Error ? error.message : '' });
    }
  });
}

type Specs<Name extends string> = Readonly<Record<Name, QuantitySpec>>;
export type Entries<Name extends string> = Record<Name, TypedEntry>;
export type EntryChange = (entry: TypedEntry, spec: QuantitySpec, path: string) => TypedEntry;

const namesOf = <Name extends string>(specs: Specs<Name>) => Object.keys(specs) as Name[];

/** Changes every entry that `specs` names; `prefix` leads to them in the form. */
export function mapEntries<Name extends string, Values extends Entries<Name>>(
  values: Values,
  specs: Specs<Name>,
  { change, prefix = '' }: { change: EntryChange; prefix?: string },
): Values {
  const changed = namesOf(specs).map((name) => [
    name,
    change(values[name], specs[name], prefix + name),
  ]);
  return { ...values, ...(Object.fromEntries(changed) as Entries<Name>) };
}

/** Yup rules for every entry that `specs` names. */
export function entryRules<Name extends string>(
  specs: Specs<Name>,
  units: UnitSystem,
  required: readonly NoInfer<Name>[] = [],
) {
  return Object.fromEntries(
    namesOf(specs).map((name) => [
      name,
      entryRule({ spec: specs[name], units, required: required.includes(name) }),
    ]),
  ) as Record<Name, ReturnType<typeof entryRule>>;
}

/** Under this key the stored texts name the units they were typed in. */
const UNITS_KEY = '@units';

/** The texts of a form as its record keeps them. */
export function collectTexts(
  units: UnitSystem,
  visit: (change: EntryChange) => unknown,
): Record<string, string> {
  const texts: Record<string, string> = { [UNITS_KEY]: units };
  visit((entry, _spec, path) => {
    if (entry.text.trim() !== '') texts[path] = entry.text;
    return entry;
  });
  return texts;
}

const SAME_WITHIN = 1e-9;

/** Puts the texts back as they were typed, where they were typed in these units and stand for the stored value. */
export function recallTexts(texts: Record<string, string>, units: UnitSystem): EntryChange {
  const same = UNIT_SYSTEMS.find((system) => system === texts[UNITS_KEY]) === units;
  return (entry, spec, path) => {
    const text = texts[path];
    if (!same || text === undefined || entry.si === null) return entry;
    const read = readEntry(text, spec, units).si;
    const agrees = read !== null && Math.abs(read - entry.si) <= SAME_WITHIN * Math.abs(entry.si);
    return agrees ? { text, si: entry.si } : entry;
  };
}

interface EntryFieldProps {
  name: string;
  spec: QuantitySpec;
  units: UnitSystem;
  remark?: string;
  required?: boolean;
  placeholder?: string;
}

/** A quantity of a record's form. */
export function EntryField({ name, spec, units, ...rest }: EntryFieldProps) {
  const [input, meta, helpers] = useField<TypedEntry>(name);
  return (
    <QuantityInput
      {...rest}
      name={name}
      spec={spec}
      units={units}
      value={input.value.text}
      onChangeText={(text) => void helpers.setValue(typedEntry(text, spec, units))}
      onBlur={() => void helpers.setTouched(true)}
      error={meta.touched ? meta.error : undefined}
    />
  );
}
