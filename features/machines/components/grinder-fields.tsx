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
import { GUARDS, ROTATIONS } from '@/shared/domain/machines';
import { TEXT_LIMITS } from '@/shared/domain/limits';

import { GRINDER_FIELDS, GRINDER_LISTS, type GrinderField } from '../fields';
import type { GrinderValues } from '../grinder-values';
import { GUARD_WORDS, ROTATION_WORDS } from '../words';

function Quantity({ name, required }: { name: GrinderField; required?: boolean }) {
  const { values } = useFormikContext<GrinderValues>();
  return (
    <EntryField name={name} spec={GRINDER_FIELDS[name]} units={values.units} required={required} />
  );
}

export function GrinderFields() {
  const { values } = useFormikContext<GrinderValues>();
  return (
    <Stack>
      <TextField
        name="name"
        label="Name"
        hint="As the shop calls it."
        maxLength={TEXT_LIMITS.name}
        required
      />
      <Heading>Motor and spindle</Heading>
      <FieldRow>
        <Quantity name="motorNoLoadRpm" required />
        <Quantity name="motorPowerW" required />
      </FieldRow>
      <Quantity name="spindleMaximumRpm" />
      <ChoiceField
        name="wheelRotation"
        label="The wheel turns, seen from the tailstock"
        hint="As the grinder stands on the tool post, looking towards the headstock."
        as="rows"
        options={[
          ...ROTATIONS.map((value) => ({ value, label: ROTATION_WORDS[value] })),
          { value: UNKNOWN, label: 'Not looked at yet' },
        ]}
      />
      <Heading>Guard and post</Heading>
      <ChoiceField
        name="guard"
        label="Guard"
        hint="Outside work does not run without one."
        as="rows"
        options={GUARDS.map((value) => ({ value, label: GUARD_WORDS[value] }))}
      />
      <Quantity name="postStiffnessNPerMm" />
      <FormFold
        label="Shims"
        value={values.shimsMm.si?.length ? `${values.shimsMm.si.length} kept` : 'none recorded'}
        names={['shimsMm']}
      >
        <ListField name="shimsMm" spec={GRINDER_LISTS.shimsMm} units={values.units} />
      </FormFold>
    </Stack>
  );
}
