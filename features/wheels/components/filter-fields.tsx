import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';

import { quantityHint, readEntry } from '@/features/forms';
import { FieldRow } from '@/features/records';
import { useShop } from '@/features/session';
import { Checkbox } from '@/features/ui/checkbox';
import { Field } from '@/features/ui/field';
import { RadioRows } from '@/features/ui/radio-row';
import { Small } from '@/features/ui/text';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { ABRASIVES, WHEEL_STATES } from '@/shared/domain/wheels';
import { unitLabel } from '@/shared/units/entry-units';
import { entryText } from '@/shared/units/format';

import { wheelQueries, type WheelSearch } from '../queries';
import { daysAfter, FILTER_SPECS, GROUP_LABELS, type FilterGroup } from '../rack-filters';
import { STATE_WORDS } from '../words';

interface FilterFieldsProps {
  group: FilterGroup;
  search: WheelSearch;
  /** ISO date of the shop. */
  today: string;
  /** Sets parts of the address; an empty text takes a part out. */
  onChange: (parts: Record<string, string>) => void;
}

const ANY = '';
const MONTH_DAYS = 30;

/** The control of one filter of the rack. */
export function FilterFields({ group, search, today, onChange }: FilterFieldsProps) {
  const rows = (key: string, value: string | undefined, options: [string, string][]) => (
    <RadioRows
      name={`rack-${key}`}
      label={GROUP_LABELS[group]}
      value={value ?? ANY}
      onChange={(next) => onChange({ [key]: next })}
      options={[[ANY, 'Any'], ...options].map(([option = '', label = '']) => ({
        value: option,
        label,
      }))}
    />
  );
  switch (group) {
    case 'usable':
      return (
        <Checkbox
          name="rack-usable"
          label="Only wheels that may be mounted or run today"
          checked={search.usable === 'yes'}
          onChange={(on) => onChange({ usable: on ? 'yes' : '' })}
        />
      );
    case 'state':
      return rows(
        'state',
        search.state,
        WHEEL_STATES.map((state) => [state, STATE_WORDS[state]]),
      );
    case 'abrasive':
      return rows(
        'abrasive',
        search.abrasive,
        ABRASIVES.map((abrasive) => [abrasive, abrasive]),
      );
    case 'grain':
      return <GrainField grain={search.grain} onChange={onChange} />;
    case 'diameter':
      return (
        <FieldRow>
          <RangeField name="diameterFromMm" search={search} onChange={onChange} />
          <RangeField name="diameterToMm" search={search} onChange={onChange} />
        </FieldRow>
      );
    case 'limit':
      return <RangeField name="limitFromRpm" search={search} onChange={onChange} />;
    case 'due': {
      const month = daysAfter(today, MONTH_DAYS);
      const other = search.dueBy && ![today, month].includes(search.dueBy) ? search.dueBy : null;
      return rows('dueBy', search.dueBy, [
        [today, 'Due now: close look, ring test or expiry'],
        [month, `Due within ${MONTH_DAYS} days`],
        ...(other ? [[other, `Due by ${other}`] as [string, string]] : []),
      ]);
    }
    case 'place':
      return <PlaceField place={search.place} onChange={onChange} />;
  }
}

type Change = Pick<FilterFieldsProps, 'onChange'>;

function GrainField({ grain, onChange }: Change & { grain: number | undefined }) {
  const [text, setText] = useState(grain === undefined ? '' : String(grain));
  const wrong = text.trim() !== '' && !/^\d{1,4}$/.test(text.trim());
  return (
    <Field
      name="rack-grain"
      label={GROUP_LABELS.grain}
      hint="A number, like 60."
      value={text}
      inputMode="numeric"
      maxLength={4}
      error={wrong ? 'Grain is a whole number, like 60.' : undefined}
      onChangeText={(next) => {
        setText(next);
        if (/^\d*$/.test(next.trim())) onChange({ grain: next.trim() });
      }}
    />
  );
}

interface RangeFieldProps extends Pick<FilterFieldsProps, 'search' | 'onChange'> {
  name: keyof typeof FILTER_SPECS;
}

/** A length or rpm; the address keeps it in mm or rpm, whatever it was typed in. */
function RangeField({ name, search, onChange }: RangeFieldProps) {
  const { units } = useShop();
  const spec = FILTER_SPECS[name];
  const value = search[name];
  const [text, setText] = useState(value === undefined ? '' : entryText(value, spec.unit, units));
  const { error } = readEntry(text, spec, units);
  return (
    <Field
      name={`rack-${name}`}
      label={spec.label}
      hint={quantityHint(spec, units)}
      unit={unitLabel(spec.unit, units)}
      value={text}
      maxLength={TEXT_LIMITS.typed}
      error={error}
      onChangeText={(next) => {
        setText(next);
        const { si } = readEntry(next, spec, units);
        if (si !== null || next.trim() === '') onChange({ [name]: si === null ? '' : String(si) });
      }}
    />
  );
}

function PlaceField({ place, onChange }: Change & { place: string | undefined }) {
  const { shop } = useShop();
  const { data } = useQuery(wheelQueries.places(shop.id));
  const places = data?.items ?? [];
  const chosen = places.find((known) => known.toLowerCase() === place?.toLowerCase()) ?? place;
  const options = chosen && !places.includes(chosen) ? [chosen, ...places] : places;
  if (options.length === 0) return <Small>No wheel has a place yet.</Small>;
  return (
    <RadioRows
      name="rack-place"
      label={GROUP_LABELS.place}
      value={chosen ?? ANY}
      onChange={(next) => onChange({ place: next })}
      options={[
        { value: ANY, label: 'Anywhere' },
        ...options.map((known) => ({ value: known, label: known })),
      ]}
    />
  );
}
