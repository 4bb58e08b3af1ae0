import { byMark, openLedger, searched, tally } from '@/features/numbers/ledger';
import { isNumberCheck } from '@/shared/rules/published';
import { jones } from '@/shared/rules/published/jones';
import { SOURCE_MARKS, SOURCES } from '@/shared/rules/sources';

const ledger = openLedger();

it('holds every source of the registry once, under its mark, those with checks first', () => {
  const groups = byMark(ledger);
  expect(groups.map(({ mark }) => mark)).toEqual([...SOURCE_MARKS]);
  expect(groups.flatMap(({ entries }) => entries.map(({ id }) => id)).sort()).toEqual(
    Object.keys(SOURCES).sort(),
  );
  for (const { entries } of groups) {
    const checked = entries.map(({ checks }) => checks.length > 0);
    expect(checked).toEqual([...checked].sort((one, other) => Number(other) - Number(one)));
  }
});

it('counts a check that differs on this device', () => {
  const wrong = jones.filter(isNumberCheck).map((one) => ({ ...one, got: () => 47 }));
  expect(tally(openLedger(wrong))).toEqual({ checks: 1, sources: 1, missed: 1 });
});

it('searches sources whole and checks one by one, whatever the spaces and capitals', () => {
  const ids = (search: string) => searched(ledger, search).map(({ id }) => id);
  expect(ids('')).toHaveLength(ledger.length);
  expect(ids('p. 1318')).toContain('mh31-1318');
  expect(ids('HARDENED bushings')).toEqual(['mh31-1317']);
  expect(searched(ledger, 'hardened bushings')[0]?.checks).toHaveLength(1);
  expect(ids('4 456 rpm')).toContain('hk-59l-5-3');
  expect(ids('smallest diamond')).toEqual(['mh31-1303']);
});
