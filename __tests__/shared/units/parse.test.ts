import fc from 'fast-check';

import type { EntryUnit } from '@/shared/units/entry-units';
import { parseQuantity } from '@/shared/units/parse';
import { UNIT_NAMES, type UnitName } from '@/shared/units/unit';

const length = (text: string, bare: EntryUnit = 'mm') => parseQuantity(text, 'mm', bare);

describe('reading what was typed', () => {
  it.each<[string, EntryUnit, number, EntryUnit]>([
    ['12', 'mm', 12, 'mm'],
    ['12 mm', 'in', 12, 'mm'],
    ['12mm', 'in', 12, 'mm'],
    ['0,5', 'mm', 0.5, 'mm'],
    ['.005', 'in', 0.127, 'in'],
    ['5.', 'mm', 5, 'mm'],
    ['0.5in', 'mm', 12.7, 'in'],
    ['0.5 in.', 'mm', 12.7, 'in'],
    ['0.5"', 'mm', 12.7, 'in'],
    ['0.5″', 'mm', 12.7, 'in'],
    ['1/2 in', 'mm', 12.7, 'in'],
    ['1 1/4', 'in', 31.75, 'in'],
    ['1-1/4', 'in', 31.75, 'in'],
    ['1–1/4"', 'mm', 31.75, 'in'],
    ['1¼', 'in', 31.75, 'in'],
    ['½ in', 'mm', 12.7, 'in'],
    ['-1 1/4', 'in', -31.75, 'in'],
    ['5 thou', 'mm', 0.127, 'thou'],
    ['3 µm', 'mm', 0.003, 'µm'],
    ['3 μm', 'mm', 0.003, 'µm'],
    ['3 micron', 'mm', 0.003, 'µm'],
    ['2.5 cm', 'mm', 25, 'cm'],
    ["2'", 'mm', 609.6, 'ft'],
    ['+4', 'mm', 4, 'mm'],
    ['-4', 'mm', -4, 'mm'],
    ['−4', 'mm', -4, 'mm'],
    ['- 4', 'mm', -4, 'mm'],
    ['15\u00a0438', 'mm', 15438, 'mm'],
    ['15\u202f438,25', 'mm', 15438.25, 'mm'],
    ['  7 \t', 'mm', 7, 'mm'],
    ['1,234', 'mm', 1.234, 'mm'],
    ['12 MM', 'in', 12, 'mm'],
  ])('reads %j as a length', (text, bare, mm, unit) => {
    const read = length(text, bare);
    expect(read).toEqual({ ok: true, value: expect.closeTo(mm, 9), unit });
  });

  it.each<[string, UnitName, EntryUnit, number, EntryUnit]>([
    ['25 m/s', 'm/s', 'ft/min', 25, 'm/s'],
    ['4300 m/min', 'm/s', 'm/s', 4300 / 60, 'm/min'],
    ['4 300 m / min', 'm/s', 'm/s', 4300 / 60, 'm/min'],
    ['6500 ft/min', 'm/s', 'm/s', 33.02, 'ft/min'],
    ['6500 sfpm', 'm/s', 'm/s', 33.02, 'ft/min'],
    ['6500 S.F.P.M.', 'm/s', 'm/s', 33.02, 'ft/min'],
    ['100', 'm/min', 'ft/min', 30.48, 'ft/min'],
    ['4300 1/min', 'rpm', 'rpm', 4300, 'rpm'],
    ['4300 r/min', 'rpm', 'rpm', 4300, 'rpm'],
    ['.004 in/rev', 'mm/rev', 'mm/rev', 0.1016, 'in/rev'],
    ['1/4 hp', 'W', 'W', 186.42496789556755, 'hp'],
    ["5° 44'", 'deg', 'deg', 5.733333333333333, 'deg'],
    ['-5 deg 44 min', 'deg', 'deg', -5.733333333333333, 'deg'],
    ['5.74°', 'deg', 'deg', 5.74, 'deg'],
    ['10 lb', 'N', 'N', 44.482216152605, 'lbf'],
    ['10 lb', 'kg', 'kg', 4.5359237, 'lb'],
    ['10 hp.min/in3', 'J/mm3', 'J/mm3', 27.3, 'hp·min/in3'],
  ])('reads %j as %s', (text, wanted, bare, value, unit) => {
    const read = parseQuantity(text, wanted, bare);
    expect(read).toMatchObject({ ok: true, unit });
    expect(read.ok && read.value).toBeCloseTo(value, wanted === 'J/mm3' ? 2 : 9);
  });

  it.each(['', '   ', '\u00a0'])('calls %j empty', (text) => {
    expect(length(text)).toEqual({ ok: false, reason: 'empty' });
  });

  it.each([
    'abc',
    'mm',
    '-',
    '+',
    '.',
    ',',
    '1..2',
    '1.2.3',
    '1,23,4',
    '12 25',
    '0 500',
    '15 4381',
    '1/0',
    '1/',
    '/2',
    '1 1/',
    '1//2',
    '1/2/3',
    '1e3',
    '0x10',
    'NaN',
    'Infinity',
    '--4',
    '5-3',
    '12 furlongs',
    '5 mm 3',
    `${'9'.repeat(400)}`,
    '٣',
    '1 1/4 1/4',
    '1/2.5',
  ])('calls %j unreadable', (text) => {
    expect(length(text)).toEqual({ ok: false, reason: 'unreadable' });
  });

  it.each(['1,234.5', '1.234,5', '1,234,567', '1.234.567', '12,345.678'])(
    'does not guess what the marks in %j mean',
    (text) => expect(length(text)).toEqual({ ok: false, reason: 'ambiguous' }),
  );

  it('refuses a lone mark before three digits where values run to thousands', () => {
    expect(parseQuantity('23,000', 'rpm', 'rpm')).toEqual({ ok: false, reason: 'ambiguous' });
    expect(parseQuantity('23.000', 'rpm', 'rpm')).toEqual({ ok: false, reason: 'ambiguous' });
    expect(parseQuantity('6,500 ft/min', 'm/s', 'm/s')).toEqual({ ok: false, reason: 'ambiguous' });
    expect(parseQuantity('0,125', 'rpm', 'rpm')).toMatchObject({ ok: true, value: 0.125 });
    expect(parseQuantity('23,00', 'rpm', 'rpm')).toMatchObject({ ok: true, value: 23 });
    expect(parseQuantity('23,0000', 'rpm', 'rpm')).toMatchObject({ ok: true, value: 23 });
  });

  it.each<[string, UnitName]>([
    ['25 rpm', 'mm'],
    ['25 m/s', 'rpm'],
    ['12 mm', 'm/s'],
    ['12 mm/min', 'm/s'],
    ['12 mm', '1'],
    ['12 kg', 'N'],
  ])('says that %j is in the wrong unit for %s', (text, wanted) => {
    expect(parseQuantity(text, wanted, wanted)).toEqual({ ok: false, reason: 'wrong unit' });
  });

  it('never throws and never gives a number that is not one', () => {
    const typed = fc.oneof(
      fc.string({ unit: 'grapheme', maxLength: 40 }),
      fc.string({ unit: fc.constantFrom(...'0123456789.,/- \'"°−½inmft'), maxLength: 40 }),
    );
    fc.assert(
      fc.property(typed, fc.constantFrom(...UNIT_NAMES), (text, unit) => {
        const read = parseQuantity(text, unit, unit);
        return read.ok ? Number.isFinite(read.value) : read.reason.length > 0;
      }),
      { numRuns: 5000 },
    );
  });

  it('reads no negative zero', () => {
    const read = length('-0');
    expect(read.ok && Object.is(read.value, 0)).toBe(true);
  });
});
