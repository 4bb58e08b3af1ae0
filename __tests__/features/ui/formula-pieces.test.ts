import { formulaPieces, withValues } from '@/features/ui/formula-pieces';

const NBSP = '\u00a0';
const set = (formula: string, values: Record<string, string | null>) =>
  withValues(formula, new Map(Object.entries(values)))
    .map((piece) => piece.text)
    .join('');

describe('a formula', () => {
  it('is cut into symbols and what stands between them', () => {
    expect(formulaPieces('{v_s} = π {D} {n} / 60 000')).toEqual([
      { text: 'v_s', term: true },
      { text: ' = π ', term: false },
      { text: 'D', term: true },
      { text: ' ', term: false },
      { text: 'n', term: true },
      { text: ` / 60${NBSP}000`, term: false },
    ]);
  });

  it.each([
    ['{N} = 60 000 {v} / (π {D})', { v: '25', D: '32' }, `60${NBSP}000 × 25 / (π × 32)`],
    ['{v_s} = π {D} {n} / 60 000', { D: '32', n: '11 400' }, `π × 32 × 11 400 / 60${NBSP}000`],
    ['{a} (1 - {K}) / {K}', { a: '0.01', K: '0.5' }, '0.01 × (1 - 0.5) / 0.5'],
    ['{k} = 48 {E} π {d}⁴ / (64 {L}³)', { E: '2', d: '3', L: '4' }, '48 × 2 × π × 3⁴ / (64 × 4³)'],
    ['({p} {t} + {q} {u}) / 60', { p: '1', t: '2', q: '3', u: '4' }, '(1 × 2 + 3 × 4) / 60'],
    ['{m} + (33/140) {b}', { m: '1', b: '2' }, '1 + (33/140) × 2'],
    ['{u} = {s} √{q}', { s: '3', q: '9' }, '3 × √9'],
    [
      '{K} = {k} / ({k} + {u} ({v}/{w}) {s})',
      { k: '1', u: '2', v: '3', w: '4', s: '5' },
      '1 / (1 + 2 × (3/4) × 5)',
    ],
    ['{f} = {p} − {v}', { p: '1', v: '−2' }, '1 − (−2)'],
  ])('%s shows its values', (formula, values, words) => {
    expect(set(formula, values)).toBe(words);
  });

  it('marks what is missing, and leaves words alone', () => {
    expect(set('{N} = 60 {v}', { v: null })).toBe('60 × ?');
    expect(set('the smaller of {a} and {b} (its number)', { a: '1', b: '2' })).toBe(
      'the smaller of 1 and 2 (its number)',
    );
  });
});
