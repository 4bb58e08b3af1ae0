import type { InferSelectModel } from 'drizzle-orm';

import type { wheels } from '@/db/schema';
import type { Wheel } from '@/shared/contracts/wheels';
import type { WheelStanding } from '@/shared/domain/wheel-life';
import type { MountedWheel, RackWheel, WheelRecord } from '@/shared/domain/wheels';
import { WHEEL_FACTS_VERSION, wheelFacts } from '@/shared/rules/wheel-facts';

import { storedFields } from '../stored-items';

export type WheelRow = InferSelectModel<typeof wheels>;

export interface WheelContent {
  tag: string;
  data: WheelRecord;
  typed: Record<string, string>;
}

export const recordColumns = ({ tag, data: { mounted, ...columns }, typed }: WheelContent) => ({
  tag,
  ...columns,
  mandrelDiameterMm: mounted?.mandrelDiameterMm ?? null,
  mandrelOverhangMm: mounted?.overhangMm ?? null,
  mandrelThreaded: mounted?.threaded ?? null,
  makerMaximumRpm: mounted?.makerMaximumRpm ?? null,
  typed,
});

/** What the entries come to, and what a list is searched by. */
export const lifeColumns = (record: WheelRecord, standing: WheelStanding) => ({
  state: standing.state,
  diameterNowMm: standing.diameterNowMm,
  looked: standing.looked,
  rung: standing.rung,
  setAsideReason: standing.setAsideReason,
  unsigned: standing.unsigned,
  receivedOn: standing.receivedOn,
  isOnSpindle: standing.onSpindle !== null,
  onGrinderId: standing.onSpindle?.grinderId ?? null,
  onQuillId: standing.onSpindle?.quillId ?? null,
  dueOn: standing.due?.on ?? null,
  dueWhy: standing.due?.why ?? null,
  ...factColumns({ ...record, ...standing }),
});

export const factColumns = (wheel: RackWheel) => ({
  ...wheelFacts(wheel),
  factsVersion: WHEEL_FACTS_VERSION,
});

export function toWheel(row: WheelRow): Wheel {
  const data = toRackWheel(row);
  const { limitRpm, usable } = wheelFacts(data);
  return {
    ...storedFields(row),
    tag: row.tag,
    data,
    typed: row.typed,
    life: {
      receivedOn: row.receivedOn,
      onSpindle: row.isOnSpindle ? { grinderId: row.onGrinderId, quillId: row.onQuillId } : null,
      due: row.dueOn !== null && row.dueWhy !== null ? { on: row.dueOn, why: row.dueWhy } : null,
      limitRpm,
      usable,
    },
  };
}

export const toRackWheel = (row: WheelRow): RackWheel => ({
  marking: row.marking,
  shape: row.shape,
  diameterNewMm: row.diameterNewMm,
  widthMm: row.widthMm,
  holeMm: row.holeMm,
  markedRpm: row.markedRpm,
  markedSpeedMPerS: row.markedSpeedMPerS,
  markingReadOn: row.markingReadOn,
  mounted: toMounted(row),
  smallestUsableMm: row.smallestUsableMm,
  madeOn: row.madeOn,
  expiresOn: row.expiresOn,
  place: row.place,
  notes: row.notes,
  state: row.state,
  diameterNowMm: row.diameterNowMm,
  looked: row.looked,
  rung: row.rung,
  setAsideReason: row.setAsideReason,
  unsigned: row.unsigned,
});

function toMounted(row: WheelRow): MountedWheel | null {
  const { mandrelDiameterMm, mandrelOverhangMm, mandrelThreaded, makerMaximumRpm } = row;
  if (mandrelDiameterMm === null || mandrelOverhangMm === null || mandrelThreaded === null)
    return null;
  return {
    mandrelDiameterMm,
    overhangMm: mandrelOverhangMm,
    threaded: mandrelThreaded,
    makerMaximumRpm,
  };
}
