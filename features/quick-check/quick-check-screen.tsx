import { useQuery } from '@tanstack/react-query';
import type { Href } from 'expo-router';
import { Formik, useFormikContext } from 'formik';
import { useEffect, useState } from 'react';

import { QuantityField } from '@/features/forms';
import { PlanReader } from '@/features/plan';
import { afterSignIn, sessionQueries } from '@/features/session';
import { readStored, writeStored } from '@/features/transport';
import { Cell, Row, Stack } from '@/features/ui/card';
import { ButtonLink, TextLink } from '@/features/ui/link';
import { Screen } from '@/features/ui/screen';
import { Segmented } from '@/features/ui/segmented';
import { Body, Heading, Small } from '@/features/ui/text';
import { quickCheck } from '@/shared/rules';

import {
  initialValues,
  inUnits,
  isQuickCheckValues,
  MARKING_UNITS,
  schema,
  specOf,
  systemOf,
  toQuickCheck,
  type QuickCheckValues,
} from './form';
import { QuickVerdict } from './quick-verdict';

const STORAGE_KEY = 'ringtrue:quick-check';

/** May this wheel run at this speed? Answered while typing, without an account. */
export function QuickCheckScreen() {
  const [start] = useState(() => {
    const stored = readStored(STORAGE_KEY);
    return isQuickCheckValues(stored) ? stored : initialValues;
  });
  return (
    <Screen
      title="Ringtrue"
      width="form"
      actions={<Door />}
      header={
        <Body tone="onEnamelSoft">
          Plan the grind before the wheel turns. Start with the question that comes first:
        </Body>
      }
    >
      <Formik
        initialValues={start}
        initialTouched={{
          diameter: true,
          marking: true,
          rpm: true,
          motorRpm: true,
          drivingPulley: true,
          drivenPulley: true,
        }}
        validateOnMount
        validationSchema={schema}
        onSubmit={() => undefined}
      >
        <QuickCheckForm />
      </Formik>
    </Screen>
  );
}

/** The way in; back to the Bench for those who are in already. */
function Door() {
  const session = useQuery(sessionQueries.current());
  return session.data ? (
    <ButtonLink kind="onEnamel" label="Bench" href={afterSignIn(session.data, undefined) as Href} />
  ) : (
    <ButtonLink kind="onEnamel" label="Sign in" href="/sign-in" />
  );
}

function QuickCheckForm() {
  const { values, setValues, setFieldValue } = useFormikContext<QuickCheckValues>();
  useEffect(() => {
    writeStored(STORAGE_KEY, values);
  }, [values]);
  const quantity = (name: Parameters<typeof specOf>[0]) => (
    <QuantityField
      name={name}
      spec={specOf(name, values.markingUnit)}
      units={systemOf(name, values)}
    />
  );
  return (
    <PlanReader units={values.units}>
      <Stack>
        <Heading>May this wheel run at this speed?</Heading>
        <Row align="flex-start">
          <Cell least={120}>
            <Segmented
              name="units"
              label="Sizes in"
              options={[
                { value: 'mm', label: 'mm' },
                { value: 'inch', label: 'inch' },
              ]}
              value={values.units}
              onChange={(units) => void setValues(inUnits(values, units))}
            />
          </Cell>
          <Cell least={190}>
            <Segmented
              name="markingUnit"
              label="The marking says"
              options={MARKING_UNITS.map((unit) => ({ value: unit, label: unit }))}
              value={values.markingUnit}
              onChange={(unit) => void setFieldValue('markingUnit', unit)}
            />
          </Cell>
        </Row>
        <Row align="flex-start">
          <Cell>{quantity('diameter')}</Cell>
          <Cell>{quantity('marking')}</Cell>
        </Row>
        <Segmented
          name="spindleWay"
          label="Spindle"
          options={[
            { value: 'rpm', label: 'rpm' },
            { value: 'pulleys', label: 'motor and pulleys' },
          ]}
          value={values.spindleWay}
          onChange={(way) => void setFieldValue('spindleWay', way)}
        />
        {values.spindleWay === 'rpm' ? (
          quantity('rpm')
        ) : (
          <>
            {quantity('motorRpm')}
            <Row align="flex-start">
              <Cell>{quantity('drivingPulley')}</Cell>
              <Cell>{quantity('drivenPulley')}</Cell>
            </Row>
          </>
        )}
        <QuickVerdict check={quickCheck(toQuickCheck(values))} />
        <Small>
          The wheel’s marking, the makers’ manuals and local law come first. This page advises; a
          competent person decides.
        </Small>
        <TextLink label="Where the numbers come from" href="/numbers" />
      </Stack>
    </PlanReader>
  );
}
