import fc from 'fast-check';

import { UNIT_SYSTEMS } from '@/shared/domain/people';
import { convertUnit, displayUnit, ENTRY_UNITS } from '@/shared/units/entry-units';
import { entryText, formatQuantity, type FormatOptions } from '@/shared/units/format';
import { parseQuantity } from '@/shared/units/parse';
import { UNIT_NAMES, type UnitName } from '@/shared/units/unit';

const anyUnit = fc.constantFrom(...UNIT_NAMES);
const anySystem = fc.constantFrom(...UNIT_SYSTEMS);
const anySize = fc.double({ min: 1e-4, max: 1e6, noNaN: true });

describe('showing a quantity', () => {
  it.each<[number, UnitName, 'mm' | 'inch', FormatOptions | undefined, string]>([
    [31.75, 'mm', 'mm', undefined, '31.75 mm'],
    [31.75, 'mm', 'inch', undefined, '1.25 in'],
    [31.75, 'mm', 'inch', { fixed: true }, '1.2500 in'],
    [31.75, 'mm', 'mm', { withUnit: false }, '31.75'],
    [0.00254, 'mm', 'inch', undefined, '0.0001 in'],
    [0.0125, 'mm', 'mm', undefined, '0.013 mm'],
    [0.0125, 'mm', 'mm', { digits: 4 }, '0.0125 mm'],
    [15438.9, 'rpm', 'mm', undefined, '15 439 rpm'],
    [15438.9, 'rpm', 'mm', { rounding: 'down' }, '15 438 rpm'],
    [15438.1, 'rpm', 'mm', { rounding: 'up' }, '15 439 rpm'],
    [4456, 'rpm', 'inch', undefined, '4 456 rpm'],
    [33.02, 'm/s', 'mm', undefined, '33 m/s'],
    [33.02, 'm/s', 'mm', { fixed: true }, '33.0 m/s'],
    [33.02, 'm/s', 'inch', undefined, '6 500 ft/min'],
    [30.48, 'm/min', 'inch', undefined, '100 ft/min'],
    [-0.25, 'mm', 'mm', undefined, '−0.25 mm'],
    [-0.0001, 'mm', 'mm', undefined, '0 mm'],
    [1234567.891, 'mm', 'mm', undefined, '1 234 567.891 mm'],
    [45.5, 'deg', 'mm', undefined, '45.5°'],
    [12, '%', 'mm', undefined, '12 %'],
    [3, '1', 'mm', undefined, '3'],
    [100, 'mm', 'mm', { digits: 0 }, '100 mm'],
    [NaN, 'mm', 'mm', undefined, '–'],
    [Infinity, 'mm', 'mm', undefined, '–'],
  ])('shows %p %s in %s with %j as %s', (value, unit, system, options, text) => {
    const shown = formatQuantity({ value, unit }, system, options);
    expect(shown).toBe(text.replaceAll(' ', '\u00a0'));
  });

  it('does not lose a step to the last bit of a double when rounding down', () => {
    const divisions = 0.3 / 0.1;
    expect(divisions).toBeLessThan(3);
    const shown = formatQuantity({ value: divisions, unit: 'div' }, 'mm', {
      rounding: 'down',
      digits: 0,
    });
    expect(shown).toBe('3\u00a0div');
  });

  it('rounds down never above and up never below the value', () => {
    fc.assert(
      fc.property(anySize, anyUnit, (value, unit) => {
        const read = (rounding: 'down' | 'up') =>
          parseQuantity(
            formatQuantity({ value, unit }, 'mm', { rounding, digits: 4, fixed: true }),
            unit,
            unit,
          );
        const [down, up] = [read('down'), read('up')];
        const slack = 1e-9 * Math.max(1, value);
        return down.ok && up.ok && down.value <= value + slack && up.value >= value - slack;
      }),
    );
  });

  it('reads back within half of its last place', () => {
    fc.assert(
      fc.property(anySize, anyUnit, anySystem, (value, unit, system) => {
        const shownUnit = displayUnit(unit, system);
        const read = parseQuantity(formatQuantity({ value, unit }, system), unit, shownUnit);
        if (!read.ok) return false;
        const step = convertUnit(10 ** -ENTRY_UNITS[shownUnit].digits, shownUnit, unit);
        return Math.abs(read.value - value) <= 0.5 * step * (1 + 1e-6) + 1e-9 * value;
      }),
    );
  });
});

describe('the text of a stored value', () => {
  it.each<[number, UnitName, 'mm' | 'inch', string]>([
    [31.75, 'mm', 'inch', '1.25'],
    [31.75, 'mm', 'mm', '31.75'],
    [0.127, 'mm', 'inch', '0.005'],
    [21.336, 'm/min', 'mm', '21.3360'],
    [23_000, 'rpm', 'mm', '23000'],
    [0, 'mm', 'inch', '0'],
    [-12.7, 'mm', 'inch', '-0.5'],
    [Number.NaN, 'mm', 'mm', ''],
  ])('of %p %s in %s is %j', (value, unit, system, text) => {
    expect(entryText(value, unit, system)).toBe(text);
  });

  it('reads back within a billionth in either system', () => {
    fc.assert(
      fc.property(anySize, anyUnit, anySystem, (value, unit, system) => {
        const read = parseQuantity(entryText(value, unit, system), unit, displayUnit(unit, system));
        return read.ok && Math.abs(read.value - value) <= 1e-9 * value;
      }),
      { numRuns: 1000 },
    );
  });

  it('is the same each time the units come back, since the stored value stays', () => {
    fc.assert(
      fc.property(anySize, anyUnit, (value, unit) => {
        const texts = Array.from({ length: 100 }, (_, turn) =>
          entryText(value, unit, turn % 2 === 0 ? 'inch' : 'mm'),
        );
        return new Set(texts).size <= 2;
      }),
    );
  });

  it('wanders by less than a ten-millionth when units are switched, and texts read again, a hundred times', () => {
    fc.assert(
      fc.property(anySize, anyUnit, (value, unit) => {
        let stored = value;
        for (let turn = 0; turn < 100; turn += 1) {
          const system = turn % 2 === 0 ? 'inch' : 'mm';
          const read = parseQuantity(
            entryText(stored, unit, system),
            unit,
            displayUnit(unit, system),
          );
          if (!read.ok) return false;
          stored = read.value;
        }
        return Math.abs(stored - value) <= 1e-7 * value;
      }),
      { numRuns: 200 },
    );
  });

  it('counts one pass as a pass', () => {
    expect(formatQuantity({ value: 1, unit: 'passes' }, 'mm')).toBe('1\u00a0pass');
    expect(formatQuantity({ value: 2, unit: 'passes' }, 'inch')).toBe('2\u00a0passes');
  });
});
