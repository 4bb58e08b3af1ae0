import fc from 'fast-check';

import { newValues, withText, type SetupValues } from '@/features/setups/form';
import { QUANTITY_FIELDS, type QuantityPath } from '@/features/setups/fields';
import { LIMITS } from '@/shared/domain/limits';
import { OPERATIONS } from '@/shared/domain/setups';
import { planSetup } from '@/shared/rules';

import { GOOD_INPUTS } from '../../support/plan-inputs';

const LENGTHS = (Object.keys(QUANTITY_FIELDS) as QuantityPath[]).filter(
  (path) => QUANTITY_FIELDS[path].unit === 'mm',
);

/** A length in ten-thousandths of an inch, which is a whole number of 0.00254 mm: both texts are exact. */
const texts = (tenths: number) => ({
  inch: (tenths / 10_000).toFixed(4),
  mm: ((tenths * 254) / 100_000).toFixed(5),
});

/** A plan as its words and its numbers: the last bits of doubles may differ between the two ways in. */
function planOf(values: SetupValues) {
  const machines = GOOD_INPUTS[values.inputs.operation]();
  const plan = planSetup({ ...machines, ...values.inputs, wheel: machines.wheel });
  const numbers: number[] = [];
  const words = JSON.stringify(plan, (_, value: unknown) => {
    if (typeof value !== 'number') return value;
    numbers.push(value);
    return '#';
  });
  return { words, numbers };
}

const near = (one: number, other: number) =>
  Math.abs(one - other) <= 1e-9 + 1e-7 * Math.max(Math.abs(one), Math.abs(other));

it('makes one plan of lengths typed in inches and of the same in millimetres', () => {
  const typed = fc.array(
    fc.record({
      path: fc.constantFrom(...LENGTHS),
      share: fc.double({ min: 0, max: 1, noNaN: true }),
    }),
    { minLength: 1, maxLength: 12 },
  );
  fc.assert(
    fc.property(fc.constantFrom(...OPERATIONS), typed, (operation, entries) => {
      const base = (units: 'mm' | 'inch'): SetupValues => ({
        ...newValues(operation, units),
        inputs: GOOD_INPUTS[operation](),
      });
      let [metric, inch] = [base('mm'), base('inch')];
      for (const { path, share } of entries) {
        const { min, max } = LIMITS[QUANTITY_FIELDS[path].limit];
        const mm = Math.max(min, 0.003) * (max / Math.max(min, 0.003)) ** share;
        const both = texts(Math.round((mm / 25.4) * 10_000));
        metric = withText(metric, path, both.mm);
        inch = withText(inch, path, both.inch);
      }
      const [one, other] = [planOf(metric), planOf(inch)];
      expect(other.words).toBe(one.words);
      const apart = one.numbers.filter((value, index) => !near(value, other.numbers[index] ?? NaN));
      expect(apart).toEqual([]);
    }),
    { numRuns: 300 },
  );
});
