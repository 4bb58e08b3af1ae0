import { useQuery } from '@tanstack/react-query';
import { Formik, useFormikContext } from 'formik';
import { useEffect, useMemo, useState } from 'react';
import * as yup from 'yup';

import { draftKey, useLocalDraft } from '@/features/forms';
import { machineQueries } from '@/features/machines';
import { useShop } from '@/features/session';
import { wheelQueries } from '@/features/wheels';
import type { Setup } from '@/shared/contracts/setups';
import { assemblePlanInput, planSetup } from '@/shared/rules';

import { PlannerLayout } from './components/planner-layout';
import type { QuantityPath } from './fields';
import { inUnits, setupSchema, valuesOf, type SetupValues } from './form';
import { PlannerProvider } from './planner-context';
import { saveWords } from './save-words';
import { useAutosave } from './use-autosave';

export interface PlannerStart {
  values: SetupValues;
  /** The version the values were typed over; null for a setup the server has not seen. */
  version: number | null;
  savedAt: string | null;
  /** True when the values hold more than the server has. */
  unsent: boolean;
  /** The server's setup, when the kept draft stands on an older version of it. */
  theirs: Setup | null;
}

const schema = yup.lazy((values: SetupValues) =>
  setupSchema(values.inputs.operation, values.units),
);

/** One setup being planned: form, live plan, draft on the device, and saving as it goes. */
export function Planner({ setupId, start }: { setupId: string; start: PlannerStart }) {
  const { units } = useShop();
  const [initialValues] = useState(() => inUnits(start.values, units));
  const typed = Object.keys(initialValues.texts) as QuantityPath[];
  return (
    <Formik
      initialValues={initialValues}
      // What came back from the device may hold texts that cannot be read: say so at once.
      initialTouched={{ texts: Object.fromEntries(typed.map((path) => [path, true])) }}
      validateOnMount
      validationSchema={schema}
      onSubmit={() => undefined}
    >
      <PlannerBody setupId={setupId} start={start} />
    </Formik>
  );
}

function PlannerBody({ setupId, start }: { setupId: string; start: PlannerStart }) {
  const { shop, person, units } = useShop();
  const { values, setValues } = useFormikContext<SetupValues>();
  useEffect(() => {
    if (values.units !== units) void setValues(inUnits(values, units));
  }, [units, values, setValues]);

  const equipment = useEquipment(values);
  const input = useMemo(
    () =>
      assemblePlanInput(values.inputs, {
        ...equipment.data,
        rules: shop.rules,
        today: todayIn(shop.timeZone),
      }),
    [values.inputs, equipment.data, shop.rules, shop.timeZone],
  );
  const plan = useMemo(() => planSetup(input), [input]);

  const save = useAutosave({
    shopId: shop.id,
    setupId,
    values,
    version: start.version,
    savedAt: start.savedAt,
    unsent: start.unsent,
    theirs: start.theirs,
    valid: values.name.trim() !== '',
  });
  const key = draftKey(person.personId, shop.id, `setup:${setupId}`);
  useLocalDraft(key, { values, version: save.version }, save.state.kind !== 'saved');

  return (
    <PlannerProvider
      plan={plan}
      input={input}
      lathes={equipment.lathes}
      grinders={equipment.grinders}
      wheel={equipment.wheel}
    >
      <PlannerLayout
        setupId={setupId}
        saved={saveWords(save.state, shop.timeZone)}
        stored={save.version !== null}
        saveState={save.state}
        onRetry={() => void save.saveNow()}
        onResolve={(theirs, keep) => {
          if (keep === 'theirs') {
            const taken = inUnits(valuesOf(theirs), units);
            save.take(theirs, taken);
            void setValues(taken);
          } else save.keepMine(theirs);
        }}
      />
    </PlannerProvider>
  );
}

/** The machines and the wheel that the inputs name. */
function useEquipment({ inputs }: SetupValues) {
  const { shop } = useShop();
  const { latheId, grinderId, quillId } = inputs.machine;
  const { wheelId } = inputs.wheel;
  const lathes = useQuery(machineQueries.lathes(shop.id));
  const grinders = useQuery(machineQueries.grinders(shop.id));
  const wheel = useQuery({
    ...wheelQueries.detail(shop.id, wheelId ?? ''),
    enabled: wheelId !== null,
  });
  return useMemo(() => {
    const grinder = grinders.data?.items.find(({ id }) => id === grinderId);
    return {
      lathes: lathes.data?.items ?? [],
      grinders: grinders.data?.items ?? [],
      wheel: wheelId === null ? null : (wheel.data ?? null),
      data: {
        lathe: lathes.data?.items.find(({ id }) => id === latheId)?.data ?? null,
        grinder: grinder?.data ?? null,
        quill: grinder?.quills.find(({ id }) => id === quillId)?.data ?? null,
        wheel: wheelId === null ? null : (wheel.data?.data ?? null),
      },
    };
  }, [lathes.data, grinders.data, wheel.data, latheId, grinderId, quillId, wheelId]);
}

/** The calendar day in the shop's own time zone, as an ISO date. */
function todayIn(timeZone: string): string {
  return new Intl.DateTimeFormat('en-CA', { timeZone, dateStyle: 'short' }).format(new Date());
}
