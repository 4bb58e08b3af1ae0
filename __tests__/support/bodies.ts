import { v7 as uuidv7 } from 'uuid';

import type { CreateAppointmentRequest } from '@/shared/contracts/appointments';
import type { CreateGrinderRequest, CreateLatheRequest } from '@/shared/contracts/machines';
import type { CreateSetupRequest } from '@/shared/contracts/setups';
import type { RecordEntryRequest } from '@/shared/contracts/wheel-entries';
import type { CreateWheelRequest } from '@/shared/contracts/wheels';
import { emptySetupInputs } from '@/shared/rules';

/** Requests that are accepted as they are. Their figures are invented, and stand for nothing. */

export const latheBody = (over: Partial<CreateLatheRequest> = {}): CreateLatheRequest => ({
  id: uuidv7(),
  name: `Lathe ${uuidv7()}`,
  data: {
    spindleSpeedsRpm: [50, 100, 200, 400],
    feedsMmPerRev: [0.1, 0.2, 0.4],
    crossSlideDivisionMm: 0.02,
    crossSlideReads: 'diameter',
    crossSlideDivisionsPerTurn: 200,
    compoundZero: 'cross-slide',
    compoundDivisionMm: 0.02,
    compoundTravelMm: 100,
    compoundMmPerTurn: 2,
    spindleNose: 'locked',
  },
  typed: { compoundTravelMm: '100 mm' },
  ...over,
});

export const quillBody = (): CreateGrinderRequest['quills'][number] => ({
  id: uuidv7(),
  name: 'Stepped quill',
  data: {
    segments: [
      { lengthMm: 30, diameterMm: 12 },
      { lengthMm: 40, diameterMm: 18 },
    ],
    material: 'steel',
    markedMaximumRpm: 30_000,
    seatDiameterMm: 8,
    threadHand: 'right',
    measuredStiffnessNPerMm: 4000,
    measuredFrequencyHz: 900,
  },
});

export const grinderBody = (over: Partial<CreateGrinderRequest> = {}): CreateGrinderRequest => ({
  id: uuidv7(),
  name: `Grinder ${uuidv7()}`,
  data: {
    motorNoLoadRpm: 2900,
    motorPowerW: 500,
    spindleMaximumRpm: 26_000,
    beltSteps: [
      {
        id: uuidv7(),
        name: 'A',
        drivingPulleyMm: 140,
        drivenPulleyMm: 40,
        beltThicknessMm: 2,
        measured: { rpm: 9900, measuredOn: '2026-01-15', instrument: 'Tachometer 1' },
      },
      {
        id: uuidv7(),
        name: 'B',
        drivingPulleyMm: 160,
        drivenPulleyMm: 32,
        beltThicknessMm: 2,
        measured: null,
      },
    ],
    guard: 'fixed',
    postStiffnessNPerMm: 6000,
    wheelRotation: 'clockwise',
    shimsMm: [0.1, 0.5],
  },
  typed: {},
  quills: [quillBody()],
  ...over,
});

export const wheelBody = (over: Partial<CreateWheelRequest> = {}): CreateWheelRequest => ({
  id: uuidv7(),
  tag: uuidv7().slice(-12),
  data: {
    marking: 'A 60 K 7 V',
    diameterNewMm: 25,
    widthMm: 20,
    holeMm: 8,
    markedRpm: 26_700,
    markedSpeedMPerS: 35,
    markingReadOn: 'box',
    mounted: null,
    shape: '1',
    smallestUsableMm: 12,
    madeOn: '2025-11-03',
    expiresOn: '2099-06-30',
    place: 'Drawer 2',
    notes: null,
  },
  received: { on: null, diameterMm: 24.5, looked: 'sound', rung: 'clear' },
  typed: { widthMm: '20' },
  ...over,
});

export const setupBody = (over: Partial<CreateSetupRequest> = {}): CreateSetupRequest => ({
  id: uuidv7(),
  name: 'Jaws of the small chuck',
  inputs: emptySetupInputs('jaws'),
  typed: { 'work.jawBoreMm': '2 3/8 in' },
  ...over,
});

/** A step of a wheel in its first version, on a day that is past whenever the tests run. */
export const entryBody = (
  step: RecordEntryRequest['step'],
  over: Partial<RecordEntryRequest> = {},
): RecordEntryRequest => ({
  id: uuidv7(),
  version: 1,
  happenedOn: new Date().toISOString().slice(0, 10),
  note: null,
  step,
  ...over,
});

export const appointmentBody = (
  personId: string,
  over: Partial<CreateAppointmentRequest> = {},
): CreateAppointmentRequest => ({
  id: uuidv7(),
  personId,
  tasks: ['mount', 'dress', 'trial run'],
  wheelClass: 'All wheels of the shop',
  from: '2026-01-05',
  until: null,
  ...over,
});
