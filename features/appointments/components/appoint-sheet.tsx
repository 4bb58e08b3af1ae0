import { useQuery } from '@tanstack/react-query';
import { Formik, useFormikContext } from 'formik';
import { useMemo, useState } from 'react';

import {
  draftKey,
  fieldErrorsOf,
  FormErrors,
  FormProblem,
  readDraft,
  removeDraft,
  TextField,
  useLocalDraft,
} from '@/features/forms';
import { DateField, FieldRow, shopDay } from '@/features/records';
import { useShop } from '@/features/session';
import { ROLE_WORDS, shopQueries } from '@/features/shop';
import { Button } from '@/features/ui/button';
import { Checkbox } from '@/features/ui/checkbox';
import { FieldScopeProvider } from '@/features/ui/field-ids';
import { Sheet } from '@/features/ui/sheet';
import { Body, Label, Small } from '@/features/ui/text';
import { RadioRows } from '@/features/ui/radio-row';
import { APPOINTED_TASKS } from '@/shared/domain/appointments';
import { TEXT_LIMITS } from '@/shared/domain/limits';

import {
  appointmentSchema,
  isAppointmentValues,
  newAppointment,
  TASK_WORDS,
  toRequest,
  type AppointmentValues,
} from '../form';
import { useAppoint } from '../queries';

/** The lead appoints a person in writing. */
export function AppointSheet({ onClose }: { onClose: () => void }) {
  const { shop, person } = useShop();
  const appoint = useAppoint(shop.id);
  const today = shopDay(shop.timeZone);
  const key = draftKey(person.personId, shop.id, 'appointment:new');
  const [initial] = useState(
    () => readDraft(key, isAppointmentValues)?.values ?? newAppointment(today),
  );
  return (
    <FieldScopeProvider scope="appointment">
      <Formik<AppointmentValues>
        initialValues={initial}
        validationSchema={appointmentSchema}
        validateOnChange={false}
        onSubmit={async (values, { setErrors }) => {
          try {
            await appoint.mutateAsync(toRequest(values, today));
            removeDraft(key);
            onClose();
          } catch (error) {
            setErrors(fieldErrorsOf(error) ?? {});
          }
        }}
      >
        {({ submitForm, isSubmitting, dirty }) => (
          <Sheet
            open
            onClose={onClose}
            title="Appoint somebody"
            footer={
              <Button
                kind="primary"
                size="machine"
                wide
                label="Appoint"
                busy={isSubmitting}
                onPress={() => void submitForm()}
              />
            }
          >
            <KeptAppointment storageKey={key} keep={dirty && !appoint.isSuccess} />
            <FormErrors />
            {fieldErrorsOf(appoint.error) === null ? <FormProblem error={appoint.error} /> : null}
            <AppointmentFields />
          </Sheet>
        )}
      </Formik>
    </FieldScopeProvider>
  );
}

function KeptAppointment({ storageKey, keep }: { storageKey: string; keep: boolean }) {
  const { values } = useFormikContext<AppointmentValues>();
  const draft = useMemo(() => ({ values, version: null }), [values]);
  useLocalDraft(storageKey, draft, keep);
  return null;
}

function AppointmentFields() {
  const { shop } = useShop();
  const { values, errors, touched, setFieldValue } = useFormikContext<AppointmentValues>();
  const { data } = useQuery(shopQueries.members(shop.id));
  const people = data?.items.filter(({ role }) => role !== 'apprentice') ?? [];
  // The error of a list is one sentence about the whole of it, where Formik's types expect one for each item.
  const tasksError = errors.tasks as string | undefined;
  return (
    <>
      <Body>
        Only people whom the shop has appointed in writing mount, dress and trial-run wheels. What
        others do waits for the signature of one of them.
      </Body>
      <RadioRows
        name="personId"
        label="Person"
        hint="Apprentices work under somebody else’s signature and are not appointed."
        value={values.personId || null}
        onChange={(personId) => void setFieldValue('personId', personId)}
        error={touched.personId ? errors.personId : undefined}
        options={people.map(({ personId, name, role }) => ({
          value: personId,
          label: name,
          detail: ROLE_WORDS[role],
        }))}
      />
      <Label>May</Label>
      {APPOINTED_TASKS.map((task) => (
        <Checkbox
          key={task}
          name={task === APPOINTED_TASKS[0] ? 'tasks' : `tasks-${task}`}
          label={TASK_WORDS[task]}
          checked={values.tasks.includes(task)}
          onChange={(on) =>
            void setFieldValue(
              'tasks',
              on ? [...values.tasks, task] : values.tasks.filter((other) => other !== task),
            )
          }
        />
      ))}
      {tasksError ? <Small tone="stop">{tasksError}</Small> : null}
      <TextField
        name="wheelClass"
        label="Class of wheel"
        hint="Like: vitrified wheels up to 150 mm."
        maxLength={TEXT_LIMITS.wheelClass}
        required
      />
      <FieldRow>
        <DateField name="from" label="From" required />
        <DateField name="until" label="Until" hint="Leave empty where it has no end." />
      </FieldRow>
    </>
  );
}
