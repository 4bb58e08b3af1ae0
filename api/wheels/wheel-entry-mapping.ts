import type { wheelEntries } from '@/db/schema';
import type { WheelStep } from '@/shared/domain/wheel-life';

type Row = typeof wheelEntries.$inferSelect;
type StepColumns = Pick<Row, 'kind'> &
  Partial<
    Pick<
      Row,
      | 'look'
      | 'ring'
      | 'diameterMm'
      | 'grinderId'
      | 'quillId'
      | 'minutes'
      | 'spindleRpm'
      | 'depthMm'
      | 'passes'
      | 'reason'
      | 'signsId'
      | 'correctsId'
    >
  >;

/** Each column is named as the step's own word for it, but for the entry that a step points at. */
export function stepColumns(step: WheelStep): StepColumns {
  if (step.kind === 'countersigned') return { kind: step.kind, signsId: step.entryId };
  if (step.kind === 'correction')
    return { kind: step.kind, correctsId: step.entryId, reason: step.reason };
  return step;
}

/** The database holds every column that a kind has; a row without one is not the application's. */
function held<T>(value: T | null, row: Row): T {
  if (value === null) throw new Error(`entry ${row.id} lacks what its kind, ${row.kind}, holds`);
  return value;
}

export function toStep(row: Row): WheelStep {
  const { kind, diameterMm, minutes } = row;
  switch (kind) {
    case 'received':
      return { kind, diameterMm: held(diameterMm, row) };
    case 'inspected':
      return { kind, look: held(row.look, row), diameterMm };
    case 'ring test':
      return { kind, ring: held(row.ring, row) };
    case 'mounted':
      return { kind, grinderId: row.grinderId, quillId: row.quillId };
    case 'trial run':
      return { kind, minutes: held(minutes, row), spindleRpm: held(row.spindleRpm, row) };
    case 'dressed':
      return { kind, depthMm: held(row.depthMm, row), passes: held(row.passes, row) };
    case 'used':
      return { kind, minutes, diameterMm };
    case 'taken off':
    case 'returned':
      return { kind };
    case 'set aside':
    case 'scrapped':
      return { kind, reason: held(row.reason, row) };
    case 'countersigned':
      return { kind, entryId: held(row.signsId, row) };
    case 'correction':
      return { kind, entryId: held(row.correctsId, row), reason: held(row.reason, row) };
  }
}
