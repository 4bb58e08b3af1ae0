import { Formik, useFormikContext, type FormikProps } from 'formik';
import { createRef, type ReactNode } from 'react';

import { PlanReader } from '@/features/plan';
import type { SetupValues } from '@/features/setups/form';
import { PlannerProvider } from '@/features/setups/planner-context';
import type { Wheel } from '@/shared/contracts/wheels';
import type { UnitSystem } from '@/shared/domain/people';
import type { PlanInput } from '@/shared/domain/setups';
import { assemblePlanInput, planSetup } from '@/shared/rules';

import { showInShop, stored } from './in-shop';

const form = createRef<FormikProps<SetupValues>>();

/** What the planner on show holds. */
export function plannedValues(): SetupValues {
  if (!form.current) throw new Error('no planner is shown');
  return form.current.values;
}

function Planned({ given, children }: { given: PlanInput; children: ReactNode }) {
  const { values } = useFormikContext<SetupValues>();
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
    data: { shape: null, madeOn: null, place: null, notes: null, ...wheelData },
    typed: {},
    life: { receivedOn: '2026-01-05', onSpindle: null, due: null, limitRpm: 0, usable: true },
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
    <Formik
      innerRef={form}
      initialValues={initialValues}
      validateOnChange={false}
      onSubmit={() => undefined}
    >
      <Planned given={given}>{piece}</Planned>
    </Formik>,
  );
}
