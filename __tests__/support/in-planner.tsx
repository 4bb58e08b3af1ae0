import { Formik, useFormikContext } from 'formik';
import type { ReactNode } from 'react';

import { PlanReader } from '@/features/plan';
import type { SetupValues } from '@/features/setups/form';
import { PlannerProvider } from '@/features/setups/planner-context';
import type { Wheel } from '@/shared/contracts/wheels';
import type { UnitSystem } from '@/shared/domain/people';
import type { PlanInput } from '@/shared/domain/setups';
import { assemblePlanInput, planSetup } from '@/shared/rules';

import { showInShop, stored } from './in-shop';

/** What the last render of the planner held. */
let seen: SetupValues | null = null;

export function plannedValues(): SetupValues {
  if (!seen) throw new Error('no planner was shown');
  return seen;
}

function Planned({ given, children }: { given: PlanInput; children: ReactNode }) {
  const { values } = useFormikContext<SetupValues>();
  seen = values;
  const { lathe, grinder, quill, wheelData, rules, today } = given;
  const input = assemblePlanInput(values.inputs, {
    lathe,
    grinder,
    quill,
    wheel: values.inputs.wheel.typed ? null : wheelData,
    rules,
    today,
  });
  const wheel: Wheel | null = wheelData && {
    ...stored,
    id: '0190a000-0000-7000-8000-0000000000a1',
    tag: 'R-14',
    data: wheelData,
    typed: {},
  };
  return (
    <PlannerProvider
      input={input}
      plan={planSetup(input)}
      lathes={[]}
      grinders={[]}
      wheel={values.inputs.wheel.typed ? null : wheel}
    >
      <PlanReader units={values.units}>{children}</PlanReader>
    </PlannerProvider>
  );
}

/** Shows a piece of the planner with a live plan of a good setup. */
export function showInPlanner(piece: ReactNode, given: PlanInput, units: UnitSystem = 'mm') {
  const { operation, work, machine, wheel, cut, dress } = given;
  const initialValues: SetupValues = {
    name: 'A job',
    inputs: { operation, work, machine, wheel, cut, dress },
    texts: {},
    units,
  };
  return showInShop(
    <Formik initialValues={initialValues} validateOnChange={false} onSubmit={() => undefined}>
      <Planned given={given}>{piece}</Planned>
    </Formik>,
  );
}
