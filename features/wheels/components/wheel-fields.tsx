import { useField, useFormikContext } from 'formik';

import { TextField } from '@/features/forms';
import { MarkingField, MarkingFold } from '@/features/plan';
import {
  ChoiceField,
  DateField,
  EntryField,
  FieldRow,
  FormFold,
  UNKNOWN,
} from '@/features/records';
import { Stack } from '@/features/ui/card';
import { Checkbox } from '@/features/ui/checkbox';
import { Field } from '@/features/ui/field';
import { Segmented } from '@/features/ui/segmented';
import { Heading } from '@/features/ui/text';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { LOOK_RESULTS, MARKING_PLACES, RING_RESULTS } from '@/shared/domain/wheels';
import { ENTRY_UNITS } from '@/shared/units/entry-units';

import { MANDREL_FIELDS, WHEEL_FIELDS, type MandrelField, type WheelField } from '../fields';
import { withSpeedUnit, type WheelValues } from '../form';
import { SPEED_UNITS, speedHint, typedSpeed } from '../marked-speed';
import { LOOK_WORDS, MARKING_PLACE_WORDS, RING_WORDS } from '../words';

function WheelQuantity({ name, required }: { name: WheelField; required?: boolean }) {
  const { values } = useFormikContext<WheelValues>();
  return (
    <EntryField name={name} spec={WHEEL_FIELDS[name]} units={values.units} required={required} />
  );
}

function MandrelQuantity({ name, required }: { name: MandrelField; required?: boolean }) {
  const { values } = useFormikContext<WheelValues>();
  return (
    <EntryField
      name={`mounted.${name}`}
      spec={MANDREL_FIELDS[name]}
      units={values.units}
      required={required}
    />
  );
}

/** Under which name it hangs, and what it is. */
export function MarkingFields() {
  const { values } = useFormikContext<WheelValues>();
  return (
    <Stack>
      <FieldRow>
        <TextField
          name="tag"
          label="Tag"
          hint={`The name it hangs under on the rack, at most ${TEXT_LIMITS.tag} characters.`}
          maxLength={TEXT_LIMITS.tag}
          required
        />
        <MarkingText />
      </FieldRow>
      <MarkingFold marking={values.marking} />
    </Stack>
  );
}

function MarkingText() {
  const [input, meta, helpers] = useField<string>('marking');
  return (
    <MarkingField
      name="marking"
      value={input.value}
      onChangeText={(text) => void helpers.setValue(text)}
      onBlur={() => void helpers.setTouched(true)}
      error={meta.touched ? meta.error : undefined}
    />
  );
}

/** The speeds that are marked, and where they were read. */
export function SpeedFields() {
  return (
    <Stack>
      <Heading>Marked speed</Heading>
      <MarkedSpeed />
      <WheelQuantity name="markedRpm" />
      <ChoiceField
        name="markingReadOn"
        label="Marking read"
        hint="Small wheels carry their speed on the blotter, the box or a tag."
        as="rows"
        options={[
          ...MARKING_PLACES.map((value) => ({ value, label: MARKING_PLACE_WORDS[value] })),
          { value: UNKNOWN, label: 'not recorded' },
        ]}
      />
    </Stack>
  );
}

function MarkedSpeed() {
  const { values, errors, touched, setValues, setFieldValue, setFieldTouched } =
    useFormikContext<WheelValues>();
  const { speedUnit, markedSpeedMPerS } = values;
  const name = 'markedSpeedMPerS';
  // The entry's error is one sentence about the whole entry, where Formik's types expect one for each key.
  const error = errors[name] as string | undefined;
  return (
    <Stack gap={2}>
      <Segmented
        name="speedUnit"
        label="Unit of the marked speed"
        value={speedUnit}
        options={SPEED_UNITS.map((unit) => ({ value: unit, label: ENTRY_UNITS[unit].label }))}
        onChange={(unit) => void setValues(withSpeedUnit(values, unit))}
      />
      <Field
        name={name}
        label="Marked speed"
        hint={speedHint(speedUnit)}
        unit={ENTRY_UNITS[speedUnit].label}
        value={markedSpeedMPerS.text}
        onChangeText={(text) => void setFieldValue(name, typedSpeed(text, speedUnit))}
        onBlur={() => void setFieldTouched(name)}
        error={touched[name] ? error : undefined}
        maxLength={TEXT_LIMITS.typed}
      />
    </Stack>
  );
}

/** A wheel that has entries is as large as they make it; only of a new one is that asked. */
export function SizeFields({ isNew }: { isNew: boolean }) {
  const { values, setFieldValue } = useFormikContext<WheelValues>();
  const { isMounted } = values;
  return (
    <Stack>
      <Heading>Sizes</Heading>
      <FieldRow>
        <WheelQuantity name="diameterNewMm" required />
        {isNew ? <WheelQuantity name="diameterNowMm" /> : null}
      </FieldRow>
      <FieldRow>
        <WheelQuantity name="widthMm" required />
        <WheelQuantity name="holeMm" required={!isMounted} />
      </FieldRow>
      <FormFold
        label="Mounted wheel"
        value={isMounted ? 'on its own mandrel' : 'no'}
        names={['mounted']}
      >
        <Checkbox
          name="isMounted"
          label="The wheel sits on a mandrel of its own"
          checked={isMounted}
          onChange={(next) => void setFieldValue('isMounted', next)}
        />
        {isMounted ? (
          <>
            <MandrelQuantity name="mandrelDiameterMm" required />
            <MandrelQuantity name="overhangMm" required />
            <Checkbox
              name="mounted.threaded"
              label="The mandrel is threaded"
              hint="A threaded mandrel has the figure for half an inch of overhang of a plain one."
              checked={values.mounted.threaded}
              onChange={(next) => void setFieldValue('mounted.threaded', next)}
            />
            <MandrelQuantity name="makerMaximumRpm" />
          </>
        ) : null}
      </FormFold>
    </Stack>
  );
}

/** Until when it may run; of a new wheel also what was seen and heard when it came. */
export function StateFields({ isNew }: { isNew: boolean }) {
  return (
    <Stack>
      <Heading>Checks</Heading>
      {isNew ? (
        <>
          <ChoiceField
            name="looked"
            label="Close look"
            hint="Clean and dry, in good light: cracks, chips, stains."
            as="rows"
            options={[
              ...LOOK_RESULTS.map((value) => ({ value, label: LOOK_WORDS[value] })),
              { value: UNKNOWN, label: 'Not recorded' },
            ]}
          />
          <ChoiceField
            name="rung"
            label="Ring test"
            hint="Wheels of 4 in and under, and soft bonds, may not ring: then the look decides."
            as="rows"
            options={[
              ...RING_RESULTS.map((value) => ({ value, label: RING_WORDS[value] })),
              { value: UNKNOWN, label: 'Not recorded' },
            ]}
          />
        </>
      ) : null}
      <DateField
        name="expiresOn"
        label="Expires on"
        hint="The last day on which it may run. Leave empty where no date is given."
      />
    </Stack>
  );
}
