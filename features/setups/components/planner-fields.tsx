import { useFormikContext } from 'formik';
import type { ReactNode } from 'react';

import { QuantityInput } from '@/features/forms';
import { figureNumber } from '@/features/plan';
import { Cell, Row } from '@/features/ui/card';
import type { Figure } from '@/shared/rules';

import { quantityField, type QuantityPath } from '../fields';
import { fieldName, textOf, type SetupValues } from '../form';
import { usePlanner } from '../planner-context';

interface PlannerQuantityProps {
  path: QuantityPath;
  /** The plan's own figure, shown while nothing is typed. */
  suggested?: Figure | null;
  remark?: string;
  /** What the rules say against the value as it stands. */
  error?: string;
}

/** One number of the setup. */
export function PlannerQuantity({ path, suggested, remark, error }: PlannerQuantityProps) {
  const { values, setText } = usePlanner();
  const { errors, touched, setFieldTouched } = useFormikContext<SetupValues>();
  const name = fieldName(path);
  const own = touched.texts?.[path] ? errors.texts?.[path] : undefined;
  const suggestion = suggested ? figureNumber(suggested, values.units) : null;
  return (
    <QuantityInput
      name={name}
      spec={quantityField(path, values.inputs.operation)}
      units={values.units}
      value={textOf(values, path)}
      onChangeText={(text) => setText(path, text)}
      onBlur={() => void setFieldTouched(name, true, false)}
      error={own ?? error}
      {...(suggestion ? { placeholder: suggestion } : {})}
      {...(remark ? { remark } : {})}
    />
  );
}

/** Numbers side by side where there is room. */
export function QuantityRow({ children }: { children: readonly ReactNode[] }) {
  return (
    <Row align="flex-start">
      {children.map((child, index) => (
        <Cell key={index}>{child}</Cell>
      ))}
    </Row>
  );
}
