import { useFormikContext } from 'formik';

import { TextField } from '@/features/forms';
import { ChoiceField, DateField, EntryField, FormFold, UNKNOWN } from '@/features/records';
import { Stack } from '@/features/ui/card';
import { Checkbox } from '@/features/ui/checkbox';
import { Select } from '@/features/ui/select';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { LOOK_RESULTS, RING_RESULTS, WHEEL_SHAPES } from '@/shared/domain/wheels';

import { MANDREL_FIELDS, type MandrelField } from '../fields';
import { withShape, type WheelValues } from '../form';
import { LOOK_WORDS, RING_WORDS, shapeWords } from '../words';
import { WheelQuantity } from './wheel-fields';

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

/** What few wheels need, each with its value in the title. */
export function FurtherFields({ isNew }: { isNew: boolean }) {
  const { values, setFieldValue, setValues } = useFormikContext<WheelValues>();
  const { shape, isMounted, mounted, diameterNowMm, looked, rung } = values;
  const given = (...texts: string[]) => texts.filter((text) => text.trim() !== '').join(', ');
  const checked = [
    looked === UNKNOWN ? '' : LOOK_WORDS[looked],
    rung === UNKNOWN ? '' : RING_WORDS[rung],
  ];
  return (
    <Stack gap={1}>
      <FormFold
        label="Type"
        value={shape === UNKNOWN ? 'not recorded' : shapeWords(shape)}
        names={['mounted', 'shape']}
      >
        <Select
          name="shape"
          label="Type"
          hint="The number in front of the sizes; 52 sits on a mandrel of its own."
          value={shape}
          onChange={(next) => void setValues(withShape(values, next))}
          options={[
            { value: UNKNOWN, label: 'Not recorded' },
            ...WHEEL_SHAPES.map((value) => ({ value, label: shapeWords(value) })),
          ]}
        />
        {isMounted ? (
          <>
            <MandrelQuantity name="mandrelDiameterMm" required />
            <MandrelQuantity name="overhangMm" required />
            <Checkbox
              name="mounted.threaded"
              label="The mandrel is threaded"
              hint="A threaded mandrel has the figure for half an inch of overhang of a plain one."
              checked={mounted.threaded}
              onChange={(next) => void setFieldValue('mounted.threaded', next)}
            />
            <MandrelQuantity name="makerMaximumRpm" />
          </>
        ) : null}
      </FormFold>
      {isNew ? (
        <FormFold
          label="When it came"
          value={given(diameterNowMm.text && 'used before', ...checked) || 'new today, not checked'}
          names={['diameterNowMm', 'receivedOn', 'looked', 'rung']}
        >
          <WheelQuantity name="diameterNowMm" />
          <DateField name="receivedOn" label="Received on" hint="Leave empty for today." />
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
        </FormFold>
      ) : null}
      <FormFold
        label="Smallest usable diameter"
        value={values.smallestUsableMm.text.trim() || 'not known'}
        names={['smallestUsableMm']}
      >
        <WheelQuantity name="smallestUsableMm" />
      </FormFold>
      <FormFold
        label="Made, expires"
        value={given(values.madeOn, values.expiresOn) || 'no date given'}
        names={['madeOn', 'expiresOn']}
      >
        <DateField name="madeOn" label="Made on" />
        <DateField
          name="expiresOn"
          label="Expires on"
          hint="The last day on which it may run. Leave empty where no date is given."
        />
      </FormFold>
      <FormFold
        label="Place, notes"
        value={given(values.place, values.notes && 'with notes') || 'none'}
        names={['place', 'notes']}
      >
        <TextField
          name="place"
          label="Place"
          hint="Where it hangs: a peg, a drawer, a shelf."
          maxLength={TEXT_LIMITS.place}
        />
        <TextField name="notes" label="Notes" lines={3} maxLength={TEXT_LIMITS.note} />
      </FormFold>
    </Stack>
  );
}
