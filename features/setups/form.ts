import { getIn, setIn } from 'formik';
import * as yup from 'yup';

import { quantityText, readEntry } from '@/features/forms';
import type { Setup, UpdateSetupRequest } from '@/shared/contracts/setups';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { UNIT_SYSTEMS, type UnitSystem } from '@/shared/domain/people';
import { OPERATIONS, type Operation, type SetupInputs } from '@/shared/domain/setups';
import { completeInputs, emptySetupInputs } from '@/shared/rules';
import { entryText } from '@/shared/units/format';

import { QUANTITY_FIELDS, quantityField, type QuantityPath } from './fields';
import { OPERATION_NAMES } from './words';

/**
 * What the planner edits: the inputs in SI, and beside them the texts as typed. A text without a unit is read in
 * `units`; the SI value changes only when its text is typed anew, never by showing it in other units.
 */
export interface SetupValues {
  name: string;
  inputs: SetupInputs;
  texts: Partial<Record<QuantityPath, string>>;
  units: UnitSystem;
}

/** Under this key the stored texts name the units they were typed in. */
const UNITS_KEY = '@units';

const PATHS = Object.keys(QUANTITY_FIELDS) as QuantityPath[];

export function newValues(operation: Operation, units: UnitSystem): SetupValues {
  return {
    name: OPERATION_NAMES[operation],
    inputs: emptySetupInputs(operation),
    texts: {},
    units,
  };
}

export function valuesOf(setup: Pick<Setup, 'name' | 'inputs' | 'typed'>): SetupValues {
  const texts: SetupValues['texts'] = {};
  for (const path of PATHS) {
    const text = setup.typed[path];
    if (text !== undefined) texts[path] = text;
  }
  const units = UNIT_SYSTEMS.find((system) => system === setup.typed[UNITS_KEY]) ?? 'mm';
  return { name: setup.name, inputs: setup.inputs, texts, units };
}

export function toRequest(values: SetupValues): Omit<UpdateSetupRequest, 'version'> {
  return {
    name: values.name.trim(),
    inputs: values.inputs,
    typed: { ...values.texts, [UNITS_KEY]: values.units },
  };
}

const siOf = (values: SetupValues, path: QuantityPath): number | null =>
  (getIn(values.inputs, path) as number | null | undefined) ?? null;

/** What stands in a field: the text as typed, else the stored value in the person's units. */
export function textOf(values: SetupValues, path: QuantityPath): string {
  const text = values.texts[path];
  if (text !== undefined) return text;
  const si = siOf(values, path);
  return si === null ? '' : entryText(si, QUANTITY_FIELDS[path].unit, values.units);
}

export function withText(values: SetupValues, path: QuantityPath, text: string): SetupValues {
  const spec = quantityField(path, values.inputs.operation);
  const { si } = readEntry(text, spec, values.units);
  return {
    ...values,
    inputs: setIn(values.inputs, path, si) as SetupInputs,
    texts: { ...values.texts, [path]: text },
  };
}

/** The same values, shown in other units. What could not be read stays as it was typed. */
export function inUnits(values: SetupValues, units: UnitSystem): SetupValues {
  if (values.units === units) return values;
  const texts: SetupValues['texts'] = {};
  for (const path of PATHS) {
    const text = values.texts[path];
    if (text === undefined) continue;
    const si = siOf(values, path);
    texts[path] = si === null ? text : entryText(si, QUANTITY_FIELDS[path].unit, units);
  }
  return { ...values, texts, units };
}

/** Formik's name of a quantity: its text; the dots of the path belong to the key. */
export const fieldName = (path: QuantityPath) => `texts["${path}"]`;

export function setupSchema(operation: Operation, units: UnitSystem) {
  return yup.object({
    name: yup
      .string()
      .trim()
      .required('Give the setup a name.')
      .max(TEXT_LIMITS.name, `The name has at most ${TEXT_LIMITS.name} characters.`),
    texts: yup.object(
      Object.fromEntries(
        PATHS.map((path) => [
          path,
          quantityText({ spec: quantityField(path, operation), system: units }),
        ]),
      ),
    ),
  });
}

/** Values that came back from the device, kept perhaps before a field was added. */
export const completeValues = (values: SetupValues): SetupValues => ({
  ...values,
  inputs: completeInputs(values.inputs),
});

/** Guards what comes back from the device's storage. */
export function isSetupValues(value: unknown): value is SetupValues {
  if (typeof value !== 'object' || value === null) return false;
  const { name, inputs, texts, units } = value as Partial<SetupValues>;
  return (
    typeof name === 'string' &&
    typeof inputs === 'object' &&
    inputs !== null &&
    OPERATIONS.some((operation) => operation === inputs.operation) &&
    typeof texts === 'object' &&
    UNIT_SYSTEMS.some((system) => system === units)
  );
}
