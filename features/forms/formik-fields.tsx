import { useField } from 'formik';
import type { ComponentProps } from 'react';

import type { UnitSystem } from '@/shared/domain/people';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { unitLabel } from '@/shared/units/entry-units';
import { Field } from '@/features/ui/field';

import { quantityHint, type QuantitySpec } from './quantity';

type TextFieldProps = Omit<
  ComponentProps<typeof Field>,
  'value' | 'onChangeText' | 'onBlur' | 'error'
>;

/** A line of text of a Formik form. */
export function TextField(props: TextFieldProps) {
  const [input, meta, helpers] = useField<string>(props.name);
  return (
    <Field
      {...props}
      value={input.value}
      onChangeText={(text) => void helpers.setValue(text)}
      onBlur={() => void helpers.setTouched(true)}
      error={meta.touched ? meta.error : undefined}
    />
  );
}

interface QuantityFieldProps {
  name: string;
  spec: QuantitySpec;
  units: UnitSystem;
  remark?: string;
  required?: boolean;
  /** The suggested value, shown while nothing is typed. */
  placeholder?: string;
  /** What is wrong beyond the field's own range: "wider than the bore". */
  error?: string;
}

/** A number of a Formik form, kept as the text that was typed. */
export function QuantityField({ name, spec, units, error, ...rest }: QuantityFieldProps) {
  const [input, meta, helpers] = useField<string | undefined>(name);
  return (
    <QuantityInput
      {...rest}
      name={name}
      spec={spec}
      units={units}
      value={input.value ?? ''}
      onChangeText={(text) => void helpers.setValue(text)}
      onBlur={() => void helpers.setTouched(true)}
      error={(meta.touched ? meta.error : undefined) ?? error}
    />
  );
}

interface QuantityInputProps extends Omit<QuantityFieldProps, 'error'> {
  value: string;
  onChangeText: (text: string) => void;
  onBlur: () => void;
  error?: string;
}

/** The same without Formik's binding, for forms that keep more beside the text. */
export function QuantityInput({ spec, units, ...rest }: QuantityInputProps) {
  return (
    <Field
      {...rest}
      label={spec.label}
      hint={quantityHint(spec, units)}
      unit={unitLabel(spec.unit, units)}
      inputMode={spec.whole ? 'numeric' : 'text'}
      maxLength={TEXT_LIMITS.typed}
    />
  );
}
