import { getIn, useFormikContext } from 'formik';

import { View } from 'react-native';

import { TextField } from '@/features/forms';
import { ChoiceField, EntryField, FieldRow, FormFold, UNKNOWN } from '@/features/records';
import { Button } from '@/features/ui/button';
import { Card, Row, Stack } from '@/features/ui/card';
import { Body, Heading, Small, Subheading } from '@/features/ui/text';
import { QUILL_MATERIALS, THREAD_HANDS } from '@/shared/domain/machines';
import { TEXT_LIMITS } from '@/shared/domain/limits';

import { QUILL_FIELDS, SEGMENT_FIELDS, type QuillField } from '../fields';
import { MOST } from '../grinder-schema';
import type { GrinderValues } from '../grinder-values';
import { newQuill, newSegment, type QuillValues } from '../quill-values';
import { MATERIAL_WORDS, THREAD_WORDS } from '../words';
import { useRows } from './use-rows';

/** The quills and arbors that fit the grinder. */
export function QuillRows() {
  const { values } = useFormikContext<GrinderValues>();
  const { quills } = values;
  const rows = useRows('quills', quills, 'name');
  return (
    <Stack>
      <Heading>Quills and arbors</Heading>
      <Small>What carries the wheel: a quill reaches into bores and jaws, an arbor is short.</Small>
      {quills.map((quill, index) => (
        <Quill key={quill.id} quill={quill} index={index} onRemove={() => rows.remove(quill.id)} />
      ))}
      {quills.length < MOST.quills ? (
        <Button
          id={rows.addId}
          label="Add a quill or arbor"
          icon="add"
          onPress={() => rows.add(newQuill())}
        />
      ) : null}
    </Stack>
  );
}

interface QuillProps {
  quill: QuillValues;
  index: number;
  onRemove: () => void;
}

function Quill({ quill, index, onRemove }: QuillProps) {
  const { values } = useFormikContext<GrinderValues>();
  const at = `quills.${index}`;
  const quantity = (name: QuillField, required = false) => (
    <EntryField
      name={`${at}.${name}`}
      spec={QUILL_FIELDS[name]}
      units={values.units}
      required={required}
    />
  );
  const measured =
    quill.measuredStiffnessNPerMm.si !== null || quill.measuredFrequencyHz.si !== null;
  return (
    <Card>
      <FieldRow>
        <TextField name={`${at}.name`} label="Name" maxLength={TEXT_LIMITS.name} required />
        {quantity('seatDiameterMm', true)}
      </FieldRow>
      <Segments quill={quill} at={at} />
      <ChoiceField
        name={`${at}.material`}
        label="Material"
        options={QUILL_MATERIALS.map((value) => ({ value, label: MATERIAL_WORDS[value] }))}
      />
      {quantity('markedMaximumRpm')}
      <ChoiceField
        name={`${at}.threadHand`}
        label="Thread of the nut or screw"
        hint="A wheel that turns against the wrong hand unscrews it."
        as="rows"
        options={[
          ...THREAD_HANDS.map((value) => ({ value, label: THREAD_WORDS[value] })),
          { value: UNKNOWN, label: 'Not looked at yet' },
        ]}
      />
      <FormFold
        label="Measured"
        value={measured ? 'yes' : 'not measured'}
        names={[`${at}.measuredStiffnessNPerMm`, `${at}.measuredFrequencyHz`]}
      >
        {quantity('measuredStiffnessNPerMm')}
        {quantity('measuredFrequencyHz')}
      </FormFold>
      <Row>
        <Button
          kind="quiet"
          icon="remove"
          label="Remove"
          spoken={`Remove ${quill.name || 'this quill'}`}
          onPress={onRemove}
        />
      </Row>
    </Card>
  );
}

/** A stepped quill, section by section; the first one carries the wheel. */
function Segments({ quill, at }: { quill: QuillValues; at: string }) {
  const { values, errors, submitCount } = useFormikContext<GrinderValues>();
  const { segments } = quill;
  const rows = useRows(`${at}.segments`, segments, 'lengthMm');
  const missing: unknown = getIn(errors, `${at}.segments`);
  return (
    <Stack gap={2}>
      <Subheading>Sections, from the wheel end to the bearing</Subheading>
      <Small>One for a plain quill. Together their lengths are the overhang.</Small>
      {segments.map((segment, index) => (
        <View key={segment.id}>
          <FieldRow least={120}>
            {(['lengthMm', 'diameterMm'] as const).map((name) => (
              <EntryField
                key={name}
                name={`${at}.segments.${index}.${name}`}
                spec={{
                  ...SEGMENT_FIELDS[name],
                  label: `${SEGMENT_FIELDS[name].label} ${index + 1}`,
                }}
                units={values.units}
                required
              />
            ))}
          </FieldRow>
          {segments.length > 1 ? (
            <Row>
              <Button
                kind="quiet"
                icon="remove"
                label="Remove"
                spoken={`Remove section ${index + 1} of ${quill.name || 'this quill'}`}
                onPress={() => rows.remove(segment.id)}
              />
            </Row>
          ) : null}
        </View>
      ))}
      {submitCount > 0 && typeof missing === 'string' ? <Body tone="stop">{missing}</Body> : null}
      {segments.length < MOST.segments ? (
        <Row>
          <Button
            kind="quiet"
            id={rows.addId}
            icon="add"
            label="Add a section"
            onPress={() => rows.add(newSegment())}
          />
        </Row>
      ) : null}
    </Stack>
  );
}
