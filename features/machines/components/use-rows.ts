import { useFormikContext } from 'formik';
import { useEffect, useRef } from 'react';

import { useFieldIdsOf } from '@/features/ui/field-ids';
import { focusById } from '@/features/ui/web';

interface Row {
  id: string;
}

interface Rows<Item> {
  /** Id of the button that adds a row. */
  addId: string;
  add: (row: Item) => void;
  remove: (id: string) => void;
}

/**
 * Rows of a form that come and go. The focus goes to the first field of a new row, and back to the button that
 * adds one when a row is gone.
 */
export function useRows<Item extends Row>(
  path: string,
  rows: readonly Item[],
  firstField: string,
): Rows<Item> {
  const { setFieldValue } = useFormikContext();
  const idsOf = useFieldIdsOf();
  const addId = idsOf(path).input;
  const next = useRef<string | null>(null);
  useEffect(() => {
    if (next.current && focusById(next.current)) next.current = null;
  });
  return {
    addId,
    add: (row) => {
      next.current = idsOf(`${path}.${rows.length}.${firstField}`).input;
      void setFieldValue(path, [...rows, row], false);
    },
    remove: (id) => {
      next.current = addId;
      void setFieldValue(
        path,
        rows.filter((row) => row.id !== id),
        false,
      );
    },
  };
}
