import { useField, useFormikContext } from 'formik';

import { QuantityInput, TextField } from '@/features/forms';
import { MarkingField, MarkingFold } from '@/features/plan';
import {
  ChoiceField,
  EntryField,
  FieldRow,
  FormFold,
  typedEntry,
  UNKNOWN,
  type TypedEntry,
} from '@/features/records';
import { Stack } from '@/features/ui/card';
import { Field } from '@/features/ui/field';
import { Segmented } from '@/features/ui/segmented';
import { Heading } from '@/features/ui/text';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { MARKING_PLACES } from '@/shared/domain/wheels';
import { ENTRY_UNITS } from '@/shared/units/entry-units';

import { WHEEL_FIELDS, type WheelField } from '../fields';
import { withSpeedUnit, type WheelValues } from '../form';
import { SPEED_UNITS, speedHint, typedSpeed } from '../marked-speed';
import { readSizes, SIZE_FIELDS } from '../size-triple';
import { MARKING_PLACE_WORDS } from '../words';

/** A length or rpm of the wheel. */
export function WheelQuantity({ name, required }: { name: WheelField; required?: boolean }) {
  const { values } = useFormikContext<WheelValues>();
  return (
    <EntryField name={name} spec={WHEEL_FIELDS[name]} units={values.units} required={required} />
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
  const { values } = useFormikContext<WheelValues>();
  const { markingReadOn } = values;
  return (
    <Stack>
      <Heading>Marked speed</Heading>
      <WheelQuantity name="markedRpm" />
      <MarkedSpeed />
      <FormFold
        label="Where it was read"
        value={markingReadOn === UNKNOWN ? 'not recorded' : MARKING_PLACE_WORDS[markingReadOn]}
        names={['markingReadOn']}
      >
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
      </FormFold>
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

/** Diameter, width and hole, one by one or all from the label. */
export function SizeFields() {
  const { values } = useFormikContext<WheelValues>();
  return (
    <Stack>
      <Heading>Sizes when new</Heading>
      <NewDiameter />
      <FieldRow>
        <WheelQuantity name="widthMm" required />
        <WheelQuantity name="holeMm" required={!values.isMounted} />
      </FieldRow>
    </Stack>
  );
}

/** More letters than a keystroke brings were pasted. */
const PASTED = 3;

function NewDiameter() {
  const { values, setValues, getFieldMeta, setFieldTouched } = useFormikContext<WheelValues>();
  const name = 'diameterNewMm';
  const { error, touched } = getFieldMeta<TypedEntry>(name);
  const { units, diameterNewMm } = values;
  const entry = (field: WheelField, text: string) => typedEntry(text, WHEEL_FIELDS[field], units);
  const spread = (text: string): boolean => {
    const sizes = readSizes(text, units);
    if (sizes === null) return false;
    const read = SIZE_FIELDS.map((field, index) => [field, entry(field, sizes[index] ?? '')]);
    void setValues({ ...values, ...Object.fromEntries(read) });
    return true;
  };
  const change = (text: string) => {
    const isPasted = text.length - diameterNewMm.text.length >= PASTED;
    if (isPasted && spread(text)) return;
    void setValues({ ...values, [name]: entry(name, text) });
  };
  return (
    <QuantityInput
      name={name}
      spec={WHEEL_FIELDS[name]}
      units={units}
      value={diameterNewMm.text}
      onChangeText={change}
      onBlur={() => {
        if (!spread(diameterNewMm.text)) void setFieldTouched(name);
      }}
      error={touched ? error : undefined}
      required
    />
  );
}
