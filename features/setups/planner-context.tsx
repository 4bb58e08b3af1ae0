import { setIn, useFormikContext } from 'formik';
import { createContext, useContext, type ReactNode } from 'react';

import type { Grinder, Lathe } from '@/shared/contracts/machines';
import type { Wheel } from '@/shared/contracts/wheels';
import type { SetupInputs } from '@/shared/domain/setups';
import type { Plan, PlanInput } from '@/shared/rules';

import { withText, type SetupValues } from './form';
import type { QuantityPath } from './fields';

interface PlannerValue {
  plan: Plan;
  input: PlanInput;
  lathes: readonly Lathe[];
  grinders: readonly Grinder[];
  /** The chosen wheel of the Rack, once it is known. */
  wheel: Wheel | null;
}

const PlannerContext = createContext<PlannerValue | null>(null);

export function PlannerProvider({ children, ...value }: PlannerValue & { children: ReactNode }) {
  return <PlannerContext value={value}>{children}</PlannerContext>;
}

/** The setup being edited, the plan that follows from it, and the means to change it. */
export function usePlanner() {
  const planner = useContext(PlannerContext);
  if (!planner) throw new Error('usePlanner stands outside a PlannerProvider');
  const { values, setValues } = useFormikContext<SetupValues>();
  return {
    ...planner,
    values,
    setText: (path: QuantityPath, text: string) => void setValues(withText(values, path, text)),
    /** Several fields at once, each read as if it were typed. */
    setTexts: (texts: readonly (readonly [QuantityPath, string])[]) =>
      void setValues(texts.reduce((typed, [path, text]) => withText(typed, path, text), values)),
    /** Sets one answer that is not a number; the path is that of SetupInputs. */
    setInput: (path: string, value: unknown) =>
      void setValues({ ...values, inputs: setIn(values.inputs, path, value) as SetupInputs }),
    setInputs: (inputs: SetupInputs) => void setValues({ ...values, inputs }),
  };
}
