import fc from 'fast-check';
import Qty from 'js-quantities';
import { unit as mathUnit } from 'mathjs';

import {
  convertUnit,
  displayUnit,
  ENTRY_UNITS,
  sameMeasure,
  unitLabel,
  type EntryUnit,
} from '@/shared/units/entry-units';
import { UNIT_NAMES } from '@/shared/units/unit';

const entryUnits = Object.keys(ENTRY_UNITS) as EntryUnit[];
const withinDoubles = (value: number) => Math.abs(value) * 1e-12;

/** Each pair with its spelling in mathjs and in js-quantities (null where that package lacks it). */
const REFERENCES: [EntryUnit, EntryUnit, string, string, string | null, string | null][] = [
  ['in', 'mm', 'inch', 'mm', 'in', 'mm'],
  ['ft', 'mm', 'foot', 'mm', 'ft', 'mm'],
  ['thou', 'mm', 'mil', 'mm', null, null],
  ['µm', 'mm', 'um', 'mm', 'um', 'mm'],
  ['ft/min', 'm/min', 'foot/minute', 'm/minute', 'ft/min', 'm/min'],
  ['ft/min', 'm/s', 'foot/minute', 'm/s', 'ft/min', 'm/s'],
  ['m/min', 'm/s', 'm/minute', 'm/s', 'm/min', 'm/s'],
  ['in/min', 'mm/min', 'inch/minute', 'mm/minute', 'in/min', 'mm/min'],
  ['in/s', 'mm/min', 'inch/s', 'mm/minute', 'in/s', 'mm/min'],
  ['in2', 'mm2', 'inch^2', 'mm^2', 'in2', 'mm2'],
  ['in3', 'mm3', 'inch^3', 'mm^3', 'in3', 'mm3'],
  ['in3/min', 'mm3/s', 'inch^3/minute', 'mm^3/s', 'in3/min', 'mm3/s'],
  ['lbf', 'N', 'lbf', 'N', 'lbf', 'N'],
  ['lbf/in', 'N/mm', 'lbf/inch', 'N/mm', 'lbf/in', 'N/mm'],
  ['psi', 'N/mm2', 'psi', 'N/mm^2', 'psi', 'N/mm2'],
  ['hp', 'W', 'hp', 'W', 'hp', 'W'],
  ['hp·min/in3', 'J/mm3', 'hp minute/inch^3', 'J/mm^3', 'hp*min/in3', 'J/mm3'],
  ['lb', 'kg', 'lbm', 'kg', 'lb', 'kg'],
  ['min', 's', 'minute', 's', 'min', 's'],
  ['°F', 'K', 'degF', 'K', null, null],
];

describe('conversions', () => {
  it.each(REFERENCES.filter(([from]) => from !== '°F'))(
    'agree with mathjs from %s to %s',
    (from, to, mathFrom, mathTo) => {
      const expected = mathUnit(7.25, mathFrom).toNumber(mathTo);
      const places = ['hp', 'hp·min/in3', 'psi'].includes(from) ? 1e-6 : 1e-12;
      expect(Math.abs(convertUnit(7.25, from, to) / expected - 1)).toBeLessThan(places);
    },
  );

  it.each(REFERENCES.filter(([, , , , qtyFrom]) => qtyFrom !== null))(
    'agree with js-quantities from %s to %s',
    (from, to, _mathFrom, _mathTo, qtyFrom, qtyTo) => {
      const expected = Qty(7.25, qtyFrom ?? '').to(qtyTo ?? '').scalar;
      expect(Math.abs(convertUnit(7.25, from, to) / expected - 1)).toBeLessThan(1e-6);
    },
  );

  it('carry a difference of temperature, not a temperature', () => {
    expect(convertUnit(18, '°F', 'K')).toBeCloseTo(10, 12);
  });

  it('hold the inch at exactly 25.4 mm', () => {
    expect(convertUnit(1, 'in', 'mm')).toBe(25.4);
    expect(convertUnit(25.4, 'mm', 'in')).toBe(1);
    expect(convertUnit(10_000, 'in', 'mm')).toBe(254_000);
  });

  it('lead back to where they began', () => {
    const pairs = entryUnits.flatMap((a) =>
      entryUnits.filter((b) => sameMeasure(a, b)).map((b): [EntryUnit, EntryUnit] => [a, b]),
    );
    const finite = fc.double({ min: 1e-9, max: 1e9, noNaN: true });
    fc.assert(
      fc.property(finite, fc.constantFrom(...pairs), (value, [a, b]) => {
        const back = convertUnit(convertUnit(value, a, b), b, a);
        return Math.abs(back - value) <= withinDoubles(value);
      }),
    );
  });

  it('refuse units that measure different things', () => {
    expect(() => convertUnit(1, 'mm', 'rpm')).toThrow(RangeError);
    expect(() => convertUnit(1, 'mm/min', 'm/min')).toThrow(RangeError);
  });
});

describe('the unit shown', () => {
  it('is the unit itself in the metric system', () => {
    expect(UNIT_NAMES.map((unit) => displayUnit(unit, 'mm'))).toEqual([...UNIT_NAMES]);
  });

  it('measures the same thing in the inch system', () => {
    for (const unit of UNIT_NAMES) expect(sameMeasure(unit, displayUnit(unit, 'inch'))).toBe(true);
  });

  it('is feet a minute for every surface speed in the inch system', () => {
    expect(displayUnit('m/s', 'inch')).toBe('ft/min');
    expect(displayUnit('m/min', 'inch')).toBe('ft/min');
  });

  it('carries a label', () => {
    expect(unitLabel('mm', 'inch')).toBe('in');
    expect(unitLabel('J/mm3', 'mm')).toBe('J/mm³');
    expect(unitLabel('1', 'mm')).toBe('');
  });
});
