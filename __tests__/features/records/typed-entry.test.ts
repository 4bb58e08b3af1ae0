import {
  collectTexts,
  entryInUnits,
  entryRules,
  mapEntries,
  recallTexts,
  storedEntry,
  typedEntry,
} from '@/features/records';
import * as yup from 'yup';

const WIDTH = { label: 'Width', unit: 'mm', limit: 'wheelWidthMm' } as const;

it('shows a value in other units and leaves the value as it was typed', () => {
  const typed = typedEntry('13', WIDTH, 'mm');
  const inch = entryInUnits(typed, WIDTH, 'inch');
  expect(inch.si).toBe(13);
  // 13 / 25.4 (NIST SP 811: the inch is 25.4 mm exactly).
  expect(Number(inch.text)).toBeCloseTo(13 / 25.4, 8);
  expect(entryInUnits(inch, WIDTH, 'mm')).toEqual(typed);
});

it('reads a bare number in the units of the form, and a unit behind it over them', () => {
  expect(typedEntry('1/2', WIDTH, 'inch').si).toBeCloseTo(12.7, 9);
  expect(typedEntry('0,5 in', WIDTH, 'mm').si).toBeCloseTo(12.7, 9);
});

it('keeps what cannot be read through a change of units', () => {
  const typed = typedEntry('wide', WIDTH, 'mm');
  expect(typed.si).toBeNull();
  expect(entryInUnits(typed, WIDTH, 'inch')).toBe(typed);
});

it('takes the ends of the range in either unit, also after a change of units', () => {
  const schema = (units: 'mm' | 'inch') =>
    yup.object(entryRules({ width: WIDTH }, units, ['width']));
  for (const end of ['0.5', '300']) {
    const mm = typedEntry(end, WIDTH, 'mm');
    expect(schema('mm').isValidSync({ width: mm })).toBe(true);
    expect(schema('inch').isValidSync({ width: entryInUnits(mm, WIDTH, 'inch') })).toBe(true);
  }
  for (const outside of ['0.499', '300.1', '0', '-5', 'wide', ''])
    expect(schema('mm').isValidSync({ width: typedEntry(outside, WIDTH, 'mm') })).toBe(false);
});

describe('texts kept with a record', () => {
  const specs = { width: WIDTH };
  const store = (text: string) => {
    const values = { width: typedEntry(text, WIDTH, 'inch') };
    return collectTexts('inch', (change) => mapEntries(values, specs, { change }));
  };
  const reopen = (si: number, texts: Record<string, string>, units: 'mm' | 'inch') =>
    mapEntries({ width: storedEntry(si, WIDTH, units) }, specs, {
      change: recallTexts(texts, units),
    }).width;

  it('come back as they were typed, in the units they were typed in', () => {
    expect(reopen(12.7, store('1/2'), 'inch')).toEqual({ text: '1/2', si: 12.7 });
    expect(reopen(12.7, store('1/2'), 'mm').text).toBe('12.7');
  });

  it('give way to a value that was changed elsewhere', () => {
    expect(reopen(20, store('1/2'), 'inch').text).not.toBe('1/2');
  });
});
