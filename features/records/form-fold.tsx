import { getIn, useFormikContext } from 'formik';
import { useState, type ReactNode } from 'react';

import { Fold } from '@/features/ui/fold';

interface FormFoldProps {
  label: string;
  /** What is inside, in short. */
  value?: string;
  /** The fields inside: an error in one of them opens the fold, so that it can be reached. */
  names: readonly string[];
  children: ReactNode;
}

/** A folded part of a form that never hides a mistake. */
export function FormFold({ label, value, names, children }: FormFoldProps) {
  const { errors, submitCount } = useFormikContext();
  const [open, setOpen] = useState(false);
  const wrong = submitCount > 0 && names.some((name) => getIn(errors, name) !== undefined);
  return (
    <Fold label={label} value={value} open={open || wrong} onToggle={setOpen}>
      {children}
    </Fold>
  );
}
