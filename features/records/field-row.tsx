import { Children, type ReactNode } from 'react';

import { Cell, Row } from '@/features/ui/card';
import { useLayout } from '@/features/ui/use-layout';

interface FieldRowProps {
  children: ReactNode;
  /** The least width of a field, in pixels at the usual text size. */
  least?: number;
}

/** Fields side by side while each has room for its number, else under each other; large text needs more room. */
export function FieldRow({ children, least = 136 }: FieldRowProps) {
  const { textScale } = useLayout();
  return (
    <Row align="flex-start">
      {Children.map(children, (field) => (
        <Cell least={least * textScale}>{field}</Cell>
      ))}
    </Row>
  );
}
