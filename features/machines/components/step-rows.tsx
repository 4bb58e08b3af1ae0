import { getIn, useFormikContext } from 'formik';

import { TextField } from '@/features/forms';
import { FigureReadout } from '@/features/plan';
import { DateField, EntryField, FieldRow, FormFold } from '@/features/records';
import { Button } from '@/features/ui/button';
import { Card, Row, Stack } from '@/features/ui/card';
import { Readout, ReadoutRow } from '@/features/ui/readout';
import { Body, Heading, Small } from '@/features/ui/text';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { expectedRpm, worstRpm } from '@/shared/rules/speed';
import { formatQuantity } from '@/shared/units/format';

import { MEASURED_FIELDS, STEP_FIELDS } from '../fields';
import { MOST } from '../grinder-schema';
import { beltStepOf, newStep, type GrinderValues, type StepValues } from '../grinder-values';
import { useRows } from './use-rows';

/** The belt steps, each with the rpm that its pulleys give. */
export function StepRows() {
  const { values, errors, submitCount } = useFormikContext<GrinderValues>();
  const { beltSteps } = values;
  const rows = useRows('beltSteps', beltSteps, 'name');
  const missing: unknown = getIn(errors, 'beltSteps');
  return (
    <Stack>
      <Heading>Belt steps</Heading>
      <Small>
        Every pairing of pulleys the belt can lie on, slowest or fastest first, as you like.
      </Small>
      {beltSteps.map((step, index) => (
        <Step key={step.id} step={step} index={index} onRemove={() => rows.remove(step.id)} />
      ))}
      {submitCount > 0 && typeof missing === 'string' ? <Body tone="stop">{missing}</Body> : null}
      {beltSteps.length < MOST.beltSteps ? (
        <Button
          id={rows.addId}
          label="Add a belt step"
          icon="add"
          onPress={() => rows.add(newStep(beltSteps))}
        />
      ) : null}
    </Stack>
  );
}

interface StepProps {
  step: StepValues;
  index: number;
  onRemove: () => void;
}

function Step({ step, index, onRemove }: StepProps) {
  const { values } = useFormikContext<GrinderValues>();
  const { units } = values;
  const at = `beltSteps.${index}`;
  const { measured } = step;
  return (
    <Card>
      <FieldRow least={120}>
        <TextField name={`${at}.name`} label="Step" maxLength={MOST.stepName} required />
        <EntryField
          name={`${at}.drivingPulleyMm`}
          spec={STEP_FIELDS.drivingPulleyMm}
          units={units}
          required
        />
        <EntryField
          name={`${at}.drivenPulleyMm`}
          spec={STEP_FIELDS.drivenPulleyMm}
          units={units}
          required
        />
        <EntryField
          name={`${at}.beltThicknessMm`}
          spec={STEP_FIELDS.beltThicknessMm}
          units={units}
          required
        />
      </FieldRow>
      <StepSpeed step={step} motorRpm={values.motorNoLoadRpm.si} />
      <FormFold
        label="Measured"
        value={
          measured.rpm.si === null
            ? 'not measured'
            : formatQuantity({ value: measured.rpm.si, unit: 'rpm' }, units)
        }
        names={[`${at}.measured`]}
      >
        <EntryField name={`${at}.measured.rpm`} spec={MEASURED_FIELDS.rpm} units={units} />
        <DateField name={`${at}.measured.measuredOn`} label="Measured on" />
        <TextField
          name={`${at}.measured.instrument`}
          label="Measured with"
          hint="The tachometer, by the shop's name for it."
          maxLength={TEXT_LIMITS.name}
        />
      </FormFold>
      <Row>
        <Button
          kind="quiet"
          icon="remove"
          label="Remove"
          spoken={`Remove belt step ${step.name}`}
          onPress={onRemove}
        />
      </Row>
    </Card>
  );
}

/** What the step gives, as soon as motor and pulleys are known. */
function StepSpeed({ step, motorRpm }: { step: StepValues; motorRpm: number | null }) {
  const whole = beltStepOf(step);
  if (whole === null || motorRpm === null)
    return (
      <ReadoutRow>
        <Readout label="Held against the limits" size="small" value={null} />
      </ReadoutRow>
    );
  return (
    <ReadoutRow>
      <FigureReadout
        label="Held against the limits"
        size="small"
        figure={worstRpm(motorRpm, whole)}
      />
      <FigureReadout label="To be expected" size="small" figure={expectedRpm(motorRpm, whole)} />
    </ReadoutRow>
  );
}
