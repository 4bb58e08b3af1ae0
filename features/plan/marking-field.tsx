import { Field, type FieldProps } from '@/features/ui/field';
import { TEXT_LIMITS } from '@/shared/domain/limits';

import { readMarking } from './marking-reading';

type MarkingFieldProps = Pick<FieldProps, 'name' | 'value' | 'onChangeText' | 'onBlur' | 'error'>;

/**
 * A wheel's mark as it is typed. A mark of a maker's own system may not read: the field says where, and takes it.
 */
export function MarkingField({ value, error, ...rest }: MarkingFieldProps) {
  const reading = readMarking(value);
  return (
    <Field
      {...rest}
      label="Marking"
      hint={
        reading?.next ??
        'As it stands on the wheel, like A 60 K 8 V. Leave empty where nothing is legible.'
      }
      value={value}
      error={error ?? reading?.fault ?? undefined}
      maxLength={TEXT_LIMITS.marking}
    />
  );
}
