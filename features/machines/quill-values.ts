import {
  EMPTY_ENTRY,
  knownOrNull,
  mapEntries,
  storedEntry,
  UNKNOWN,
  type Entries,
  type EntryChange,
} from '@/features/records';
import { newId } from '@/features/transport';
import type { CreateGrinderRequest } from '@/shared/contracts/machines';
import type { QuillMaterial, ThreadHand } from '@/shared/domain/machines';
import type { UnitSystem } from '@/shared/domain/people';

import { QUILL_FIELDS, SEGMENT_FIELDS, type QuillField, type SegmentField } from './fields';

type Quill = CreateGrinderRequest['quills'][number];

export interface SegmentValues extends Entries<SegmentField> {
  /** Tells rows apart while they are edited; not stored. */
  id: string;
}

export interface QuillValues extends Entries<QuillField> {
  id: string;
  name: string;
  material: QuillMaterial;
  threadHand: ThreadHand | typeof UNKNOWN;
  segments: SegmentValues[];
}

export const newSegment = (): SegmentValues => ({
  id: newId(),
  lengthMm: EMPTY_ENTRY,
  diameterMm: EMPTY_ENTRY,
});

export const newQuill = (): QuillValues => ({
  id: newId(),
  name: '',
  seatDiameterMm: EMPTY_ENTRY,
  markedMaximumRpm: EMPTY_ENTRY,
  measuredStiffnessNPerMm: EMPTY_ENTRY,
  measuredFrequencyHz: EMPTY_ENTRY,
  material: 'steel',
  threadHand: UNKNOWN,
  segments: [newSegment()],
});

export function quillValuesOf({ id, name, data }: Quill, units: UnitSystem): QuillValues {
  const stored = (field: QuillField) => storedEntry(data[field], QUILL_FIELDS[field], units);
  return {
    id,
    name,
    seatDiameterMm: stored('seatDiameterMm'),
    markedMaximumRpm: stored('markedMaximumRpm'),
    measuredStiffnessNPerMm: stored('measuredStiffnessNPerMm'),
    measuredFrequencyHz: stored('measuredFrequencyHz'),
    material: data.material,
    threadHand: data.threadHand ?? UNKNOWN,
    segments: data.segments.map(({ lengthMm, diameterMm }) => ({
      id: newId(),
      lengthMm: storedEntry(lengthMm, SEGMENT_FIELDS.lengthMm, units),
      diameterMm: storedEntry(diameterMm, SEGMENT_FIELDS.diameterMm, units),
    })),
  };
}

export function changedQuill(quill: QuillValues, change: EntryChange): QuillValues {
  const prefix = `quills.${quill.id}.`;
  return {
    ...mapEntries(quill, QUILL_FIELDS, { change, prefix }),
    segments: quill.segments.map((segment, index) =>
      mapEntries(segment, SEGMENT_FIELDS, { change, prefix: `${prefix}segments.${index}.` }),
    ),
  };
}

/** @throws {RangeError} when a size is missing; the schema refuses that before. */
function size(value: number | null): number {
  if (value === null) throw new RangeError('A quill without its sizes cannot be sent.');
  return value;
}

/** @throws {RangeError} when a size is missing; the schema refuses that before. */
export function quillRequest(quill: QuillValues): Quill {
  return {
    id: quill.id,
    name: quill.name.trim(),
    data: {
      segments: quill.segments.map(({ lengthMm, diameterMm }) => ({
        lengthMm: size(lengthMm.si),
        diameterMm: size(diameterMm.si),
      })),
      material: quill.material,
      markedMaximumRpm: quill.markedMaximumRpm.si,
      seatDiameterMm: size(quill.seatDiameterMm.si),
      threadHand: knownOrNull(quill.threadHand),
      measuredStiffnessNPerMm: quill.measuredStiffnessNPerMm.si,
      measuredFrequencyHz: quill.measuredFrequencyHz.si,
    },
  };
}
