import fc from 'fast-check';

import {
  inUnits,
  isSetupValues,
  newValues,
  setupSchema,
  textOf,
  toRequest,
  valuesOf,
  withText,
} from '@/features/setups/form';
import { createSetupRequest } from '@/shared/contracts/setups';
import { LIMITS } from '@/shared/domain/limits';
import { QUANTITY_FIELDS, type QuantityPath } from '@/features/setups/fields';

const draft = newValues('jaws', 'mm');

describe('a setup being typed', () => {
  it('keeps the text as typed beside the value it stands for', () => {
    const typed = withText(newValues('jaws', 'inch'), 'work.jawBoreMm', '2 1/4');
    expect(typed.inputs.work.jawBoreMm).toBeCloseTo(57.15, 10);
    expect(textOf(typed, 'work.jawBoreMm')).toBe('2 1/4');
  });

  it('keeps what cannot be read, and reads nothing from it', () => {
    const typed = withText(draft, 'work.jawBoreMm', 'about two inches');
    expect(typed.inputs.work.jawBoreMm).toBeNull();
    expect(textOf(typed, 'work.jawBoreMm')).toBe('about two inches');
    expect(textOf(inUnits(typed, 'inch'), 'work.jawBoreMm')).toBe('about two inches');
  });

  it('comes back from the server as it was sent', () => {
    const typed = withText(draft, 'work.nearRunOutMm', '0,16');
    const request = toRequest(typed);
    expect(valuesOf({ ...request })).toEqual(typed);
  });

  it('shows a stored value in the reader’s units when no text is kept', () => {
    const stored = valuesOf({
      name: 'Jaws',
      inputs: withText(draft, 'work.lengthMm', '25.4').inputs,
      typed: {},
    });
    expect(textOf(inUnits(stored, 'inch'), 'work.lengthMm')).toBe('1');
  });

  it('does not change a stored value however often the units are switched', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.001, max: 9.999, noNaN: true }),
        fc.integer({ min: 1, max: 100 }),
        (runOut, times) => {
          let values = withText(draft, 'work.nearRunOutMm', runOut.toFixed(6));
          const before = values.inputs.work.nearRunOutMm;
          for (let switched = 0; switched < times; switched += 1)
            values = inUnits(values, values.units === 'mm' ? 'inch' : 'mm');
          expect(values.inputs.work.nearRunOutMm).toBe(before);
        },
      ),
      { numRuns: 200 },
    );
  });

  it('is known again when it comes back from the device', () => {
    expect(isSetupValues(JSON.parse(JSON.stringify(draft)))).toBe(true);
    expect(isSetupValues({ name: 'x' })).toBe(false);
    expect(isSetupValues(null)).toBe(false);
  });
});

describe('form and contract', () => {
  const paths = Object.keys(QUANTITY_FIELDS) as QuantityPath[];
  const base = withTypedWheel();

  it.each(paths)('judge the ends of %s alike', (path) => {
    const { min, max } = LIMITS[QUANTITY_FIELDS[path].limit];
    for (const value of [min, max, min - 1e-3 * (Math.abs(min) + 1), max * 1.001 + 1e-3]) {
      const typed = withText(base, path, String(value));
      const accepted = readBack(path, typed.inputs) !== null;
      const parsed = createSetupRequest.safeParse({
        id: '01900000-0000-7000-8000-00000000aaaa',
        ...toRequest(typed),
        inputs: withRaw(base.inputs, path, value),
      });
      expect({ value, accepted }).toEqual({ value, accepted: parsed.success });
    }
  });

  it('ask for a name', async () => {
    await expect(setupSchema('jaws', 'mm').validate({ name: '  ', texts: {} })).rejects.toThrow(
      'Give the setup a name.',
    );
  });
});

function withTypedWheel() {
  return {
    ...draft,
    inputs: {
      ...draft.inputs,
      wheel: {
        wheelId: null,
        typed: {
          marking: null,
          diameterNewMm: null,
          diameterNowMm: null,
          widthMm: null,
          holeMm: null,
          markedRpm: null,
          markedSpeedMPerS: null,
          markingReadOn: null,
          looked: null,
          rung: null,
        },
      },
    },
  };
}

function readBack(path: string, inputs: object): unknown {
  return path
    .split('.')
    .reduce<unknown>((value, key) => (value as Record<string, unknown>)[key], inputs);
}

function withRaw(inputs: object, path: string, value: number): unknown {
  const copy = JSON.parse(JSON.stringify(inputs)) as Record<string, unknown>;
  const keys = path.split('.');
  const last = keys.pop() ?? '';
  (readBack(keys.join('.'), copy) as Record<string, unknown>)[last] = value;
  return copy;
}
