import type * as yup from 'yup';

import {
  GRINDER_FIELDS,
  LATHE_FIELDS,
  LATHE_LISTS,
  MEASURED_FIELDS,
  QUILL_FIELDS,
  SEGMENT_FIELDS,
  STEP_FIELDS,
} from '@/features/machines/fields';
import { grinderSchema } from '@/features/machines/grinder-schema';
import {
  grinderInUnits,
  grinderRequest,
  grinderValuesOf,
  newGrinder,
  newStep,
  type GrinderValues,
  type StepValues,
} from '@/features/machines/grinder-values';
import {
  latheInUnits,
  latheRequest,
  latheSchema,
  latheValuesOf,
  newLathe,
  type LatheValues,
} from '@/features/machines/lathe-values';
import { newQuill, newSegment, type QuillValues } from '@/features/machines/quill-values';
import { typedEntry } from '@/features/records';
import { typedList } from '@/features/records/typed-list';
import type { QuantitySpec } from '@/features/forms';
import { createGrinderRequest, createLatheRequest } from '@/shared/contracts/machines';
import { LIMITS } from '@/shared/domain/limits';

const entry = (spec: QuantitySpec, text: string) => typedEntry(text, spec, 'mm');

const around = ({ limit }: QuantitySpec) => {
  const { min, max } = LIMITS[limit];
  return [min, max, min === 0 ? -1 : min * 0.9, max * 1.01];
};
const casesOf = <Name extends string>(specs: Record<Name, QuantitySpec>) =>
  (Object.keys(specs) as Name[]).flatMap((name) =>
    around(specs[name]).map((value) => [name, value] as const),
  );

const takes = <Values>(schema: (values: Values) => yup.AnySchema, values: Values) =>
  schema(values).isValidSync(values, { context: values });

describe('lathe', () => {
  const lathe = (): LatheValues => ({
    ...newLathe('mm'),
    name: 'Lathe 3',
    spindleSpeedsRpm: typedList('45\n70\n105', LATHE_LISTS.spindleSpeedsRpm, 'mm'),
    feedsMmPerRev: typedList('0.05\n0.1', LATHE_LISTS.feedsMmPerRev, 'mm'),
    crossSlideDivisionMm: entry(LATHE_FIELDS.crossSlideDivisionMm, '0.02'),
  });
  const contract = (data: object) => {
    const request = latheRequest(lathe());
    return createLatheRequest.safeParse({ ...request, data: { ...request.data, ...data } }).success;
  };

  it('sends what the contract takes', () => {
    expect(takes(latheSchema, lathe())).toBe(true);
    expect(createLatheRequest.safeParse(latheRequest(lathe())).success).toBe(true);
  });

  it.each(casesOf(LATHE_FIELDS))('agrees with the contract on %s of %d', (name, value) => {
    const form = { ...lathe(), [name]: entry(LATHE_FIELDS[name], String(value)) };
    expect(contract({ [name]: value })).toBe(takes(latheSchema, form));
  });

  it.each(casesOf(LATHE_LISTS))('agrees with the contract on %s that hold %d', (name, value) => {
    const form = { ...lathe(), [name]: typedList(String(value), LATHE_LISTS[name], 'mm') };
    expect(contract({ [name]: [value] })).toBe(takes(latheSchema, form));
  });

  it('asks for speeds and feeds, as the contract does', () => {
    for (const name of ['spindleSpeedsRpm', 'feedsMmPerRev'] as const) {
      const form = { ...lathe(), [name]: typedList('', LATHE_LISTS[name], 'mm') };
      expect(takes(latheSchema, form)).toBe(false);
      expect(contract({ [name]: [] })).toBe(false);
    }
  });

  it('stores the same lathe when it is saved in other units without being changed', () => {
    const request = latheRequest(lathe());
    const stored = { ...request, version: 1, createdAt: '', updatedAt: '' };
    const again = latheRequest(latheInUnits(latheValuesOf(stored, 'mm'), 'inch'));
    expect(again.data).toEqual(request.data);
  });
});

describe('grinder', () => {
  const step = (change: Partial<StepValues> = {}): StepValues => ({
    ...newStep([]),
    drivingPulleyMm: entry(STEP_FIELDS.drivingPulleyMm, '120'),
    drivenPulleyMm: entry(STEP_FIELDS.drivenPulleyMm, '30'),
    beltThicknessMm: entry(STEP_FIELDS.beltThicknessMm, '2'),
    ...change,
  });
  const quill = (change: Partial<QuillValues> = {}): QuillValues => ({
    ...newQuill(),
    name: 'Quill 18 × 85',
    seatDiameterMm: entry(QUILL_FIELDS.seatDiameterMm, '10'),
    segments: [
      {
        ...newSegment(),
        lengthMm: entry(SEGMENT_FIELDS.lengthMm, '85'),
        diameterMm: entry(SEGMENT_FIELDS.diameterMm, '18'),
      },
    ],
    ...change,
  });
  const grinder = (change: Partial<GrinderValues> = {}): GrinderValues => ({
    ...newGrinder('mm'),
    name: 'Post grinder B',
    motorNoLoadRpm: entry(GRINDER_FIELDS.motorNoLoadRpm, '2850'),
    motorPowerW: entry(GRINDER_FIELDS.motorPowerW, '370'),
    beltSteps: [step()],
    quills: [quill()],
    ...change,
  });
  const request = grinderRequest(grinder());
  const contract = (change: object) =>
    createGrinderRequest.safeParse({ ...request, ...change }).success;
  const form = (change: Partial<GrinderValues>) => takes(grinderSchema, grinder(change));

  it('sends what the contract takes', () => {
    expect(form({})).toBe(true);
    expect(contract({})).toBe(true);
  });

  it.each(casesOf(GRINDER_FIELDS))('agrees with the contract on %s of %d', (name, value) => {
    expect(contract({ data: { ...request.data, [name]: value } })).toBe(
      form({ [name]: entry(GRINDER_FIELDS[name], String(value)) }),
    );
  });

  const steps = (change: object) => ({
    data: {
      ...request.data,
      beltSteps: request.data.beltSteps.map((one) => ({ ...one, ...change })),
    },
  });

  it.each(casesOf(STEP_FIELDS))(
    'agrees with the contract on a step with %s of %d',
    (name, value) => {
      expect(contract(steps({ [name]: value }))).toBe(
        form({ beltSteps: [step({ [name]: entry(STEP_FIELDS[name], String(value)) })] }),
      );
    },
  );

  it.each(around(MEASURED_FIELDS.rpm))(
    'agrees with the contract on a measured rpm of %d',
    (rpm) => {
      const how = { measuredOn: '2026-03-01', instrument: 'Tachometer 2' };
      expect(contract(steps({ measured: { rpm, ...how } }))).toBe(
        form({
          beltSteps: [step({ measured: { rpm: entry(MEASURED_FIELDS.rpm, String(rpm)), ...how } })],
        }),
      );
    },
  );

  it('asks when and with what an rpm was measured, and for neither without one', () => {
    const rpm = entry(MEASURED_FIELDS.rpm, '11400');
    const measured = (change: Partial<StepValues['measured']>) =>
      form({
        beltSteps: [
          step({ measured: { rpm, measuredOn: '2026-03-01', instrument: 'T2', ...change } }),
        ],
      });
    expect(measured({})).toBe(true);
    expect(measured({ measuredOn: '' })).toBe(false);
    expect(measured({ measuredOn: '2026-02-30' })).toBe(false);
    expect(measured({ instrument: ' ' })).toBe(false);
    expect(measured({ rpm: entry(MEASURED_FIELDS.rpm, ''), measuredOn: '', instrument: '' })).toBe(
      true,
    );
  });

  const quills = (change: object) => ({
    quills: request.quills.map((one) => ({ ...one, data: { ...one.data, ...change } })),
  });

  it.each(casesOf(QUILL_FIELDS))(
    'agrees with the contract on a quill with %s of %d',
    (name, value) => {
      expect(contract(quills({ [name]: value }))).toBe(
        form({ quills: [quill({ [name]: entry(QUILL_FIELDS[name], String(value)) })] }),
      );
    },
  );

  it.each(casesOf(SEGMENT_FIELDS))(
    'agrees with the contract on a section with %s of %d',
    (name, value) => {
      const [section] = quill().segments;
      const [stored] = request.quills[0]?.data.segments ?? [];
      expect(contract(quills({ segments: [{ ...stored, [name]: value }] }))).toBe(
        form({
          quills: [
            quill({
              segments: [
                { ...newSegment(), ...section, [name]: entry(SEGMENT_FIELDS[name], String(value)) },
              ],
            }),
          ],
        }),
      );
    },
  );

  it('refuses two belt steps or two quills of one name, as the contract does', () => {
    const twoSteps = [step({ name: 'A' }), step({ name: ' a ' })];
    expect(form({ beltSteps: twoSteps })).toBe(false);
    const twoQuills = [quill(), quill({ name: 'quill 18 × 85' })];
    expect(form({ quills: twoQuills })).toBe(false);
    const [one] = request.data.beltSteps;
    const other = { ...one, id: newStep([]).id, name: 'a' };
    expect(contract({ data: { ...request.data, beltSteps: [one, other] } })).toBe(false);
  });

  it.each([
    ['no belt step', { beltSteps: [] }],
    [
      '21 belt steps',
      { beltSteps: Array.from({ length: 21 }, (_, at) => step({ name: `${at}` })) },
    ],
    ['a quill without a section', { quills: [quill({ segments: [] })] }],
    ['a step named in 11 letters', { beltSteps: [step({ name: 'A'.repeat(11) })] }],
    ['no name', { name: ' ' }],
  ] as const)('refuses %s, as the contract does', (_name, change) => {
    const values = grinder(change as Partial<GrinderValues>);
    expect(takes(grinderSchema, values)).toBe(false);
    expect(createGrinderRequest.safeParse(grinderRequest(values)).success).toBe(false);
  });

  it('stores the same grinder when it is saved in other units without being changed', () => {
    const stored = { ...request, version: 1, createdAt: '', updatedAt: '' };
    const again = grinderRequest(grinderInUnits(grinderValuesOf(stored, 'mm'), 'inch'));
    expect(again.data).toEqual(request.data);
    expect(again.quills).toEqual(request.quills);
  });
});
