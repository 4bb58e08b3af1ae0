import { useField } from 'formik';

import { RadioRows, type RadioRowOption } from '@/features/ui/radio-row';
import { Segmented } from '@/features/ui/segmented';

/** Stands for "nobody has looked yet", where the record holds nothing. */
export const UNKNOWN = 'unknown';

interface ChoiceFieldProps<Value extends string> {
  name: string;
  label: string;
  options: readonly RadioRowOption<Value>[];
  hint?: string;
  /** Rows have room for a reason; segments stand side by side. */
  as?: 'segments' | 'rows';
}

/** One of a few choices of a Formik form. */
export function ChoiceField<Value extends string>({
  name,
  as = 'segments',
  ...rest
}: ChoiceFieldProps<Value>) {
  const [input, meta, helpers] = useField<Value>(name);
  const Choice = as === 'rows' ? RadioRows : Segmented;
  return (
    <Choice<Value>
      {...rest}
      name={name}
      value={input.value}
      onChange={(value) => void helpers.setValue(value)}
      error={meta.touched ? meta.error : undefined}
    />
  );
}

/** The choice as the record keeps it. */
export const knownOrNull = <Value extends string>(value: Value | typeof UNKNOWN): Value | null =>
  value === UNKNOWN ? null : value;
