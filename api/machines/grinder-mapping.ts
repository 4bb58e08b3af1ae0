import type { InferSelectModel } from 'drizzle-orm';

import type { beltSteps, grinders, quills } from '@/db/schema';
import type { CreateGrinderRequest, Grinder } from '@/shared/contracts/machines';
import type { QuillData } from '@/shared/domain/machines';

import { storedFields } from '../stored-items';

export type GrinderContent = Omit<CreateGrinderRequest, 'id'>;
type BeltStepRow = InferSelectModel<typeof beltSteps>;
export type QuillRow = InferSelectModel<typeof quills>;

interface GrinderRows {
  grinder: InferSelectModel<typeof grinders>;
  /** In their order. */
  beltSteps: BeltStepRow[];
  quills: QuillRow[];
}

export function columnsOf({ name, data, typed }: GrinderContent) {
  const { beltSteps: _rowsOfTheirOwn, ...columns } = data;
  return { name, ...columns, typed };
}

export const beltStepRows = (shopId: string, grinderId: string, content: GrinderContent) =>
  content.data.beltSteps.map(({ measured, ...step }, position) => ({
    shopId,
    grinderId,
    position,
    ...step,
    measuredRpm: measured?.rpm ?? null,
    measuredOn: measured?.measuredOn ?? null,
    measuredInstrument: measured?.instrument ?? null,
  }));

export const quillRows = (shopId: string, grinderId: string, content: GrinderContent) =>
  content.quills.map(({ id, name, data: { segments, ...columns } }, position) => ({
    shopId,
    grinderId,
    id,
    position,
    name,
    segmentLengthsMm: segments.map((segment) => segment.lengthMm),
    segmentDiametersMm: segments.map((segment) => segment.diameterMm),
    ...columns,
    retiredAt: null,
  }));

export function toGrinder({ grinder, beltSteps: steps, quills: all }: GrinderRows): Grinder {
  return {
    ...storedFields(grinder),
    name: grinder.name,
    data: {
      motorNoLoadRpm: grinder.motorNoLoadRpm,
      motorPowerW: grinder.motorPowerW,
      spindleMaximumRpm: grinder.spindleMaximumRpm,
      beltSteps: steps.map(toBeltStep),
      guard: grinder.guard,
      postStiffnessNPerMm: grinder.postStiffnessNPerMm,
      wheelRotation: grinder.wheelRotation,
      shimsMm: grinder.shimsMm,
    },
    typed: grinder.typed,
    quills: all.map((row) => ({ id: row.id, name: row.name, data: toQuillData(row) })),
  };
}

function toBeltStep(row: BeltStepRow) {
  const { measuredRpm, measuredOn, measuredInstrument } = row;
  const isMeasured = measuredRpm !== null && measuredOn !== null && measuredInstrument !== null;
  return {
    id: row.id,
    name: row.name,
    drivingPulleyMm: row.drivingPulleyMm,
    drivenPulleyMm: row.drivenPulleyMm,
    beltThicknessMm: row.beltThicknessMm,
    measured: isMeasured ? { rpm: measuredRpm, measuredOn, instrument: measuredInstrument } : null,
  };
}

function toQuillData(row: QuillRow): QuillData {
  return {
    segments: row.segmentLengthsMm.map((lengthMm, index) => ({
      lengthMm,
      diameterMm: segmentDiameter(row, index),
    })),
    material: row.material,
    markedMaximumRpm: row.markedMaximumRpm,
    seatDiameterMm: row.seatDiameterMm,
    threadHand: row.threadHand,
    measuredStiffnessNPerMm: row.measuredStiffnessNPerMm,
    measuredFrequencyHz: row.measuredFrequencyHz,
  };
}

function segmentDiameter(row: QuillRow, index: number): number {
  const diameterMm = row.segmentDiametersMm[index];
  if (diameterMm === undefined) throw new Error(`quill ${row.id} has a segment without diameter`);
  return diameterMm;
}
