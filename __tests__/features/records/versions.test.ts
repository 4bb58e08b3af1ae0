import { keyPart, rowParts, type Part } from '@/features/records';
import { mergedValues } from '@/features/records/conflict-sheet';

interface Row {
  id: string;
  size: number;
}
interface Values {
  name: string;
  note: string;
  rows: Row[];
}

const base: Values = { name: 'Lathe', note: 'old', rows: [{ id: 'a', size: 1 }] };
const partsOf = (versions: readonly Values[]): Part<Values>[] => [
  keyPart('name', 'Name', (name) => name),
  keyPart('note', 'Note', (note) => note),
  ...rowParts<Row, 'rows', Values>('rows', versions, {
    label: ({ id }) => id,
    words: ({ size }) => String(size),
  }),
];
const merge = (mine: Values, theirs: Values, sides: Record<string, 'mine' | 'theirs'> = {}) =>
  mergedValues(partsOf([mine, theirs]), { base, mine, theirs }, sides);

it('keeps what I changed and takes what only they changed', () => {
  const mine = { ...base, name: 'Lathe 3' };
  const theirs = { ...base, note: 'new' };
  expect(merge(mine, theirs)).toEqual({ ...base, name: 'Lathe 3', note: 'new' });
});

it('keeps mine where both changed the same fact, until theirs is chosen', () => {
  const mine = { ...base, note: 'mine' };
  const theirs = { ...base, note: 'theirs' };
  expect(merge(mine, theirs).note).toBe('mine');
  expect(merge(mine, theirs, { note: 'theirs' }).note).toBe('theirs');
});

it('takes a row that they added, and drops one that they removed', () => {
  const added = { ...base, rows: [...base.rows, { id: 'b', size: 2 }] };
  expect(merge(base, added).rows.map(({ id }) => id)).toEqual(['a', 'b']);
  expect(merge(base, { ...base, rows: [] }).rows).toEqual([]);
  expect(merge(base, { ...base, rows: [] }, { 'rows.a': 'mine' }).rows).toEqual(base.rows);
});

it('keeps mine everywhere when nobody knows what both started from', () => {
  const theirs = { ...base, note: 'theirs' };
  const merged = mergedValues(partsOf([base, theirs]), { base: null, mine: base, theirs }, {});
  expect(merged).toEqual(base);
});
