import * as yup from 'yup';

import { listInUnits, listRule, storedList } from '@/features/records';
import { readList, typedList } from '@/features/records/typed-list';

const SPEEDS = { label: 'Spindle speeds', unit: 'rpm', limit: 'spindleSpeedRpm' } as const;
const FEEDS = { label: 'Feeds', unit: 'mm/rev', limit: 'feedMmPerRev' } as const;

it.each([
  ['45\n70\n105', [45, 70, 105]],
  ['45; 70;105', [45, 70, 105]],
  ['105\r\n45\n\n70\n', [45, 70, 105]],
  ['31,5\n45', [31.5, 45]],
  ['70\n70', [70]],
])('reads %j as distinct values, smallest first', (text, values) => {
  expect(readList(text, SPEEDS, 'mm').si).toEqual(values);
});

it.each(['45, 70, 105', '45 70 105', '5 105', '1 200'])(
  'refuses %j, which may be one number or several, and says how to write it',
  (text) => {
    const { si, error } = readList(text, SPEEDS, 'mm');
    expect(si).toBeNull();
    expect(error).toContain('line of its own');
  },
);

it.each(['45\nfast', '0', '-45', '10001', '45 mm'])('refuses %j', (text) => {
  expect(readList(text, SPEEDS, 'mm').si).toBeNull();
});

it('takes sixty values and no more', () => {
  const lines = (count: number) =>
    Array.from({ length: count }, (_, index) => index + 1).join('\n');
  expect(readList(lines(60), SPEEDS, 'mm').si).toHaveLength(60);
  expect(readList(lines(61), SPEEDS, 'mm').error).toContain('60');
});

it('asks for at least one', () => {
  const schema = yup.object({ speeds: listRule(SPEEDS, 'mm') });
  expect(schema.isValidSync({ speeds: typedList('', SPEEDS, 'mm') })).toBe(false);
  expect(schema.isValidSync({ speeds: typedList('45', SPEEDS, 'mm') })).toBe(true);
});

it('shows feeds in inches and leaves the stored feeds alone', () => {
  const stored = storedList([0.0508, 0.1016], FEEDS, 'mm');
  const inch = listInUnits(stored, FEEDS, 'inch');
  expect(inch.text).toBe('0.002\n0.004');
  expect(inch.si).toEqual([0.0508, 0.1016]);
});
