import {
  inUnits,
  newWheel,
  toRequest,
  valuesOf,
  wheelDataOf,
  withSpeedUnit,
  type WheelValues,
} from '@/features/wheels/form';
import { MANDREL_FIELDS, WHEEL_FIELDS } from '@/features/wheels/fields';
import { typedSpeed } from '@/features/wheels/marked-speed';
import { wheelSchema } from '@/features/wheels/schema';
import { typedEntry } from '@/features/records';
import { createWheelRequest, type Wheel } from '@/shared/contracts/wheels';
import { LIMITS } from '@/shared/domain/limits';

const mm = (field: keyof typeof WHEEL_FIELDS, text: string) =>
  typedEntry(text, WHEEL_FIELDS[field], 'mm');
const mandrel = (field: keyof typeof MANDREL_FIELDS, text: string) =>
  typedEntry(text, MANDREL_FIELDS[field], 'mm');

const hole = (size: string) => ({
  diameterNowMm: mm('diameterNowMm', '400'),
  holeMm: mm('holeMm', size),
});

/** A wheel in the middle of every range. */
const whole = (): WheelValues => ({
  ...newWheel('mm'),
  tag: 'R-14',
  diameterNewMm: mm('diameterNewMm', '600'),
  diameterNowMm: mm('diameterNowMm', '550'),
  widthMm: mm('widthMm', '20'),
  holeMm: mm('holeMm', '76'),
  markedRpm: mm('markedRpm', '900'),
  markedSpeedMPerS: typedSpeed('25', 'm/s'),
});

const accepts = (values: WheelValues) =>
  wheelSchema(values).isValidSync(values, { context: values });

function problemsOf(values: WheelValues): string[] {
  try {
    wheelSchema(values).validateSync(values, { abortEarly: false, context: values });
    return [];
  } catch (error) {
    return (error as { errors: string[] }).errors;
  }
}

const life = { receivedOn: '2026-01-05', onSpindle: null, due: null, limitRpm: 0, usable: true };

/** As the server would answer with it. */
const storedWheel = (values: WheelValues, version: number): Wheel => {
  const { received: _received, ...request } = toRequest(values);
  const data = wheelDataOf(values);
  if (!data) throw new Error('a whole wheel');
  return { ...request, data, life, version, createdAt: '', updatedAt: '' };
};

const contractAccepts = (values: WheelValues, data: object) => {
  const request = toRequest(values);
  return createWheelRequest.safeParse({ ...request, data: { ...request.data, ...data } }).success;
};

it('sends what the contract takes', () => {
  expect(accepts(whole())).toBe(true);
  expect(createWheelRequest.safeParse(toRequest(whole())).success).toBe(true);
});

describe('form and contract agree at the ends of every range', () => {
  const around = ({ min, max }: { min: number; max: number }) => [
    min,
    max,
    min === 0 ? -1 : min * 0.99,
    max * 1.01,
  ];
  const cases = [
    ...around(LIMITS.wheelWidthMm).map((value) => ['widthMm', value] as const),
    ...around(LIMITS.wheelHoleMm).map((value) => ['holeMm', value] as const),
    ...around(LIMITS.wheelRpm).map((value) => ['markedRpm', value] as const),
    ...around(LIMITS.wheelDiameterMm).map((value) => ['diameterNewMm', value] as const),
  ];
  it.each(cases)('%s of %d', (field, value) => {
    const base: WheelValues =
      field === 'diameterNewMm'
        ? { ...whole(), holeMm: mm('holeMm', '0'), diameterNowMm: mm('diameterNowMm', '') }
        : whole();
    const form = accepts({ ...base, [field]: mm(field, String(value)) });
    expect(contractAccepts(base, { [field]: value })).toBe(form);
  });

  it.each(around(LIMITS.wheelSpeedMPerS))('marked speed of %d m/s', (value) => {
    const form = accepts({ ...whole(), markedSpeedMPerS: typedSpeed(String(value), 'm/s') });
    expect(contractAccepts(whole(), { markedSpeedMPerS: value })).toBe(form);
  });

  it.each([
    ...around(LIMITS.quillDiameterMm).map((value) => ['mandrelDiameterMm', value] as const),
    ...around(LIMITS.quillLengthMm).map((value) => ['overhangMm', value] as const),
    ...around(LIMITS.wheelRpm).map((value) => ['makerMaximumRpm', value] as const),
  ])('%s of %d', (field, value) => {
    const base = {
      ...whole(),
      isMounted: true,
      mounted: {
        mandrelDiameterMm: mandrel('mandrelDiameterMm', '6'),
        overhangMm: mandrel('overhangMm', '13'),
        makerMaximumRpm: mandrel('makerMaximumRpm', '30000'),
        threaded: false,
      },
    };
    const mounted = { ...base.mounted, [field]: mandrel(field, String(value)) };
    const stored = toRequest(base).data.mounted;
    expect(contractAccepts(base, { mounted: { ...stored, [field]: value } })).toBe(
      accepts({ ...base, mounted }),
    );
  });

  it.each([
    ['a tag of 20 letters', { tag: 'W'.repeat(20) }, true],
    ['a tag of 21 letters', { tag: 'W'.repeat(21) }, false],
    ['no tag', { tag: '  ' }, false],
    ['a marking of 40 letters', { marking: 'A'.repeat(40) }, true],
    ['a marking of 41 letters', { marking: 'A'.repeat(41) }, false],
    ['a hole of the size of the wheel', hole('400'), false],
    ['a hole a little smaller than the wheel', hole('399.9'), true],
    ['a wheel that grew', { diameterNowMm: mm('diameterNowMm', '601') }, false],
    ['a wheel that did not wear', { diameterNowMm: mm('diameterNowMm', '600') }, true],
  ] as const)('%s', (_name, change, verdict) => {
    const values: WheelValues = { ...whole(), ...change };
    expect(accepts(values)).toBe(verdict);
    expect(createWheelRequest.safeParse(toRequest(values)).success).toBe(verdict);
  });
});

it('names each missing field, and no optional one', () => {
  const words = problemsOf(newWheel('mm')).join(' ');
  for (const field of ['tag', 'diameter when new', 'width', 'hole']) expect(words).toContain(field);
  expect(words).not.toContain('rpm');
});

it('asks for no hole of a mounted wheel, but for its mandrel', () => {
  const values = { ...whole(), isMounted: true, holeMm: mm('holeMm', '') };
  const words = problemsOf(values).join(' ');
  expect(words).not.toContain('hole');
  expect(words).toContain('mandrel diameter');
  expect(words).toContain('overhang');
});

it('reads a marked speed in the unit it is marked in, whatever the units of the reader', () => {
  const values = { ...whole(), markedSpeedMPerS: typedSpeed('4300', 'm/min') };
  // 4 300 / 60 m/s.
  expect(wheelDataOf(values)?.markedSpeedMPerS).toBeCloseTo(71.6667, 4);
  const feet = withSpeedUnit(values, 'ft/min');
  // 4 300 x 0.3048 / 60 m/s.
  expect(wheelDataOf(feet)?.markedSpeedMPerS).toBeCloseTo(21.844, 6);
  expect(inUnits(values, 'inch').markedSpeedMPerS).toBe(values.markedSpeedMPerS);
});

it('says that a marked speed is out of range in the unit of the marking', () => {
  const values = withSpeedUnit({ ...whole(), markedSpeedMPerS: typedSpeed('5', 'm/s') }, 'm/min');
  expect(problemsOf(values).join(' ')).toContain('60 to 12000 m/min');
});

it('stores the same wheel when it is saved in other units without being changed', () => {
  const fresh = { ...whole(), holeMm: mm('holeMm', '31.75') };
  const request = toRequest(fresh);
  const wheel = storedWheel(fresh, 3);
  const again = toRequest(inUnits(valuesOf(wheel, 'mm'), 'inch'));
  expect(again.data).toEqual(request.data);
  expect(toRequest(inUnits(valuesOf(wheel, 'inch'), 'mm')).data).toEqual(request.data);
});

it('shows a wheel as it was typed when it is opened again', () => {
  const values = inUnits(newWheel('inch'), 'inch');
  const typed = {
    ...values,
    tag: 'R-1',
    diameterNewMm: typedEntry('1 1/4', WHEEL_FIELDS.diameterNewMm, 'inch'),
    widthMm: typedEntry('0,5', WHEEL_FIELDS.widthMm, 'inch'),
    holeMm: typedEntry('3/8', WHEEL_FIELDS.holeMm, 'inch'),
  };
  const wheel = storedWheel(typed, 1);
  const opened = valuesOf(wheel, 'inch');
  expect([opened.diameterNewMm.text, opened.widthMm.text, opened.holeMm.text]).toEqual([
    '1 1/4',
    '0,5',
    '3/8',
  ]);
});
