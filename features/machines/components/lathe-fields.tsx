import { useFormikContext } from 'formik';

import { TextField } from '@/features/forms';
import {
  ChoiceField,
  EntryField,
  FieldRow,
  FormFold,
  ListField,
  UNKNOWN,
} from '@/features/records';
import { Stack } from '@/features/ui/card';
import { Heading } from '@/features/ui/text';
import { COMPOUND_ZEROS, DIAL_READINGS, SPINDLE_NOSES } from '@/shared/domain/machines';
import { TEXT_LIMITS } from '@/shared/domain/limits';

import { LATHE_FIELDS, LATHE_LISTS, type LatheField, type LatheList } from '../fields';
import type { LatheValues } from '../lathe-values';
import { COMPOUND_ZERO_WORDS, DIAL_WORDS, NOSE_WORDS } from '../words';

function Quantity({ name, required }: { name: LatheField; required?: boolean }) {
  const { values } = useFormikContext<LatheValues>();
  return (
    <EntryField name={name} spec={LATHE_FIELDS[name]} units={values.units} required={required} />
  );
}

function Numbers({ name }: { name: LatheList }) {
  const { values } = useFormikContext<LatheValues>();
  return <ListField name={name} spec={LATHE_LISTS[name]} units={values.units} />;
}

export function LatheFields() {
  const { values } = useFormikContext<LatheValues>();
  const compound =
    values.compoundZero === UNKNOWN ? 'not recorded' : COMPOUND_ZERO_WORDS[values.compoundZero];
  return (
    <Stack>
      <TextField
        name="name"
        label="Name"
        hint="As the shop calls it."
        maxLength={TEXT_LIMITS.name}
        required
      />
      <Heading>Speeds and feeds</Heading>
      <FieldRow least={220}>
        <Numbers name="spindleSpeedsRpm" />
        <Numbers name="feedsMmPerRev" />
      </FieldRow>
      <Heading>Cross-slide</Heading>
      <ChoiceField
        name="crossSlideReads"
        label="The dial reads"
        hint="Turn it by ten divisions and measure: radius is the slide's own travel, diameter twice that."
        options={DIAL_READINGS.map((value) => ({ value, label: DIAL_WORDS[value] }))}
      />
      <FieldRow>
        <Quantity name="crossSlideDivisionMm" required />
        <Quantity name="crossSlideDivisionsPerTurn" />
      </FieldRow>
      <Heading>Spindle</Heading>
      <ChoiceField
        name="spindleNose"
        label="Spindle nose"
        hint="Work running backwards can unscrew a chuck from a threaded nose."
        as="rows"
        options={[
          ...SPINDLE_NOSES.map((value) => ({ value, label: NOSE_WORDS[value] })),
          { value: UNKNOWN, label: 'Not looked at yet' },
        ]}
      />
      <FormFold
        label="Compound slide"
        value={compound}
        names={['compoundDivisionMm', 'compoundMmPerTurn', 'compoundTravelMm']}
      >
        <ChoiceField
          name="compoundZero"
          label="With its scale at zero it lies"
          hint="Lathes mark this differently: set it to zero and look."
          as="rows"
          options={[
            ...COMPOUND_ZEROS.map((value) => ({ value, label: COMPOUND_ZERO_WORDS[value] })),
            { value: UNKNOWN, label: 'not looked at yet' },
          ]}
        />
        <Quantity name="compoundDivisionMm" />
        <Quantity name="compoundMmPerTurn" />
        <Quantity name="compoundTravelMm" />
      </FormFold>
    </Stack>
  );
}
