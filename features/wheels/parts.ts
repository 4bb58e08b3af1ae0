import {
  dayWords,
  keyPart,
  NOT_GIVEN,
  readDate,
  UNKNOWN,
  type Part,
  type TypedEntry,
} from '@/features/records';
import type { UnitName } from '@/shared/units/unit';
import { formatQuantity } from '@/shared/units/format';

import { MANDREL_FIELDS, WHEEL_FIELDS } from './fields';
import type { WheelValues } from './form';
import { speedWords } from './marked-speed';
import { LOOK_WORDS, MARKING_PLACE_WORDS, RING_WORDS, shapeWords, STATE_WORDS } from './words';

const quantity =
  (unit: UnitName) =>
  (entry: TypedEntry, { units }: WheelValues): string =>
    entry.si === null
      ? entry.text.trim() || NOT_GIVEN
      : formatQuantity({ value: entry.si, unit }, units);

const date = (key: 'madeOn' | 'expiresOn', label: string): Part<WheelValues> =>
  keyPart(key, label, (text) => {
    const day = readDate(text);
    return day ? dayWords(day) : text.trim() || NOT_GIVEN;
  });

const field = (name: keyof typeof WHEEL_FIELDS): Part<WheelValues> =>
  keyPart(name, WHEEL_FIELDS[name].label, quantity(WHEEL_FIELDS[name].unit));

function mandrelWords({ mounted, isMounted }: WheelValues, values: WheelValues): string {
  if (!isMounted) return 'no mandrel';
  const { mandrelDiameterMm, overhangMm, makerMaximumRpm } = MANDREL_FIELDS;
  return [
    `mandrel ${quantity(mandrelDiameterMm.unit)(mounted.mandrelDiameterMm, values)}`,
    `overhang ${quantity(overhangMm.unit)(mounted.overhangMm, values)}`,
    mounted.threaded ? 'threaded' : 'plain',
    `maker's rpm ${quantity(makerMaximumRpm.unit)(mounted.makerMaximumRpm, values)}`,
  ].join(', ');
}

/** Everything a wheel's form holds, fact by fact. */
export const wheelParts: Part<WheelValues>[] = [
  keyPart('tag', 'Tag', (tag) => tag.trim() || NOT_GIVEN),
  keyPart('marking', 'Marking', (marking) => marking.trim() || 'nothing legible'),
  field('diameterNewMm'),
  {
    ...field('diameterNowMm'),
    words: (values) =>
      quantity('mm')(
        values.diameterNowMm.text.trim() ? values.diameterNowMm : values.diameterNewMm,
        values,
      ),
  },
  field('widthMm'),
  field('holeMm'),
  field('smallestUsableMm'),
  field('markedRpm'),
  {
    key: 'markedSpeedMPerS',
    label: 'Marked speed',
    words: ({ markedSpeedMPerS, speedUnit }) =>
      markedSpeedMPerS.si === null ? NOT_GIVEN : speedWords(markedSpeedMPerS.si, speedUnit),
    take: (into, { markedSpeedMPerS, speedUnit }) => ({ ...into, markedSpeedMPerS, speedUnit }),
  },
  keyPart('markingReadOn', 'Marking read', (place) =>
    place === UNKNOWN ? NOT_GIVEN : MARKING_PLACE_WORDS[place],
  ),
  {
    key: 'shape',
    label: 'Type',
    words: ({ shape }) => (shape === UNKNOWN ? NOT_GIVEN : shapeWords(shape)),
    take: (into, { shape, isMounted }) => ({ ...into, shape, isMounted }),
  },
  {
    key: 'mounted',
    label: 'Mandrel',
    words: (values) => mandrelWords(values, values),
    take: (into, { shape, isMounted, mounted }) => ({ ...into, shape, isMounted, mounted }),
  },
  keyPart('looked', 'Close look', (looked) =>
    looked === UNKNOWN ? 'not recorded' : LOOK_WORDS[looked],
  ),
  keyPart('rung', 'Ring test', (rung) => (rung === UNKNOWN ? 'not recorded' : RING_WORDS[rung])),
  date('madeOn', 'Made on'),
  date('expiresOn', 'Expires on'),
  keyPart('place', 'Place', (place) => place.trim() || NOT_GIVEN),
  keyPart('notes', 'Notes', (notes) => notes.trim() || NOT_GIVEN),
  {
    key: 'state',
    label: 'State',
    words: ({ state, setAsideReason }) =>
      state === 'set aside' ? `${STATE_WORDS[state]}: ${setAsideReason}` : STATE_WORDS[state],
    take: (into, { state, setAsideReason }) => ({ ...into, state, setAsideReason }),
  },
];

const FROM_ENTRIES = new Set(['diameterNowMm', 'looked', 'rung', 'state']);

/** Those that are edited; the others follow from the wheel's entries. */
export const recordParts = wheelParts.filter(({ key }) => !FROM_ENTRIES.has(key));
