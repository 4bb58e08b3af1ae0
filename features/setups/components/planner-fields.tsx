import { useFormikContext } from 'formik';
import type { ReactNode } from 'react';

import { QuantityInput } from '@/features/forms';
import { figureNumber } from '@/features/plan';
import { Cell, Row } from '@/features/ui/card';
import type { UnitSystem } from '@/shared/domain/people';
import type { Figure } from '@/shared/rules';

import { quantityField, type QuantityPath } from '../fields';
import { fieldName, textOf, type SetupValues } from '../form';
import { usePlanner } from '../planner-context';

interface PlannerQuantityProps {
  path: QuantityPath;
  /** The plan's own figure, shown while nothing is typed. */
  suggested?: Figure | null;
  /** Decimal places of the suggestion in mm; the unit's own when left out. */
  places?: number;
  remark?: string;
  /** What the rules say against the value as it stands. */
  error?: string;
}

/** One number of the setup. */
export function PlannerQuantity({ path, suggested, places, remark, error }: PlannerQuantityProps) {
  const { values, setText } = usePlanner();
  const { errors, touched, setFieldTouched } = useFormikContext<SetupValues>();
  const name = fieldName(path);
  const own = touched.texts?.[path] ? errors.texts?.[path] : undefined;
  const suggestion = suggested
    ? figureNumber(suggested, values.units, placesIn(places, values.units))
    : null;
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

/** An inch needs one place more than a millimetre to keep half a division. */
const placesIn = (places: number | undefined, units: UnitSystem) =>
  places === undefined ? {} : { digits: units === 'mm' ? places : places + 1 };

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
