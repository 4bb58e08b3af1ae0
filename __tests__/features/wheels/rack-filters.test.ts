import { daysAfter, filterWords, searchOf, SORTS } from '@/features/wheels/rack-filters';
import { wheelQuery } from '@/shared/contracts/wheels';

const reader = { units: 'mm', today: '2026-03-02' } as const;

it('asks the server for what the address says', () => {
  const address = {
    search: ' A 60 ',
    usable: 'yes',
    state: 'mounted',
    abrasive: 'silicon carbide',
    grain: '60',
    diameterFromMm: '25.4',
    diameterToMm: '100',
    limitFromRpm: '20000',
    dueBy: '2026-03-31',
    place: 'Drawer 2',
    sort: 'largest',
    wheel: 'not a filter',
  };
  const search = searchOf(address);
  expect(search).toEqual({
    search: 'A 60',
    usable: 'yes',
    state: 'mounted',
    abrasive: 'silicon carbide',
    grain: 60,
    diameterFromMm: 25.4,
    diameterToMm: 100,
    limitFromRpm: 20_000,
    dueBy: '2026-03-31',
    place: 'Drawer 2',
    sort: 'diameter',
    order: 'down',
  });
  expect(wheelQuery.safeParse(search).success).toBe(true);
});

it.each([
  { usable: 'no', state: 'lost', abrasive: 'sand' },
  { grain: '6.5', diameterFromMm: '0', diameterToMm: 'wide', limitFromRpm: '-1' },
  { dueBy: '2026-02-31', sort: 'colour', place: '  ', search: '' },
])('sends nothing of %j, which the server would refuse', (address) => {
  expect(searchOf(address)).toEqual({});
});

it.each(SORTS)('offers an order the server knows: $label', ({ value }) => {
  expect(wheelQuery.safeParse(searchOf({ sort: value })).success).toBe(true);
});

it('says what is asked for in the units of the reader', () => {
  expect(filterWords('diameter', { diameterFromMm: 25.4, diameterToMm: 50.8 }, reader)).toBe(
    '25.4\u00a0mm to 50.8\u00a0mm',
  );
  expect(filterWords('diameter', { diameterToMm: 50.8 }, { ...reader, units: 'inch' })).toBe(
    'up to 2\u00a0in',
  );
  expect(filterWords('due', { dueBy: '2026-03-02' }, reader)).toBe('due now');
  expect(filterWords('due', { dueBy: '2026-04-01' }, reader)).toBe('due by 1 Apr 2026');
  expect(filterWords('grain', {}, reader)).toBeNull();
});

it('counts days over the end of a month', () => {
  expect(daysAfter('2026-01-31', 30)).toBe('2026-03-02');
});
