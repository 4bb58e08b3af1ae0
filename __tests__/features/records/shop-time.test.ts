import { dayWords, readDate, shopDay, whenWords } from '@/features/records';

const LATE = '2026-03-01T23:30:00Z';

it("begins the day at midnight of the shop's own time zone", () => {
  const now = new Date(LATE);
  expect(shopDay('Europe/London', now)).toBe('2026-03-01');
  expect(shopDay('Europe/Berlin', now)).toBe('2026-03-02');
  expect(shopDay('America/Denver', now)).toBe('2026-03-01');
});

it('says the hour of today and the date of other days', () => {
  expect(whenWords('2026-03-01T09:05:00Z', 'Europe/London', new Date(LATE))).toBe('today 09:05');
  expect(whenWords('2026-02-28T09:05:00Z', 'Europe/London', new Date(LATE))).toBe('28 Feb 2026');
  expect(dayWords('2027-03-31')).toBe('31 Mar 2027');
});

it.each(['2027-03-31', '2027-3-31', ' 2027-03-31 '])('reads %j as a date', (text) => {
  expect(readDate(text)).toBe('2027-03-31');
});

it.each(['', '2027-02-30', '31.03.2027', '03/31/2027', '2027-13-01', 'soon'])(
  'reads %j as no date',
  (text) => {
    expect(readDate(text)).toBeNull();
  },
);
