/** What `npm run rules` prints. */
import { isNumberCheck, PUBLISHED } from '@/shared/rules/published';
import { jones } from '@/shared/rules/published/jones';

import { publishedTable } from '../../../rules/table';

describe('the printed table', () => {
  const { text, missed } = publishedTable(PUBLISHED);

  it('names every source once with its mark, and counts cases, sources and marks', () => {
    expect(text).toMatch(/\[handbook\] Machinery's Handbook, 31st, p\. 1318/);
    expect(text).toMatch(/\[memory\] Groover/);
    expect(text).toMatch(new RegExp(`${PUBLISHED.length} cases from \\d+ sources: law \\d+, `));
    expect(text.endsWith(`${PUBLISHED.length} agree, 0 failed`)).toBe(true);
    expect(missed).toBe(0);
  });

  it('fits 120 columns', () => {
    expect(text.split('\n').filter((line) => line.length > 120)).toEqual([]);
  });

  it('shows a miss where it stands and again at the end, and counts it', () => {
    const wrong = jones.filter(isNumberCheck).map((one) => ({ ...one, got: () => 47 }));
    const table = publishedTable(wrong);
    expect(table.missed).toBe(1);
    expect(table.text).toMatch(/^MISS {2}Lathe speed for a cutting speed/m);
    expect(table.text).toMatch(/^MISS jones: Lathe speed/m);
    expect(table.text.endsWith('0 agree, 1 failed')).toBe(true);
  });

  it('counts a rule that throws or has no answer as a miss', () => {
    const silent = jones.filter(isNumberCheck).flatMap((one) => [
      { ...one, got: () => null },
      {
        ...one,
        got: () => {
          throw new RangeError('no');
        },
      },
    ]);
    const table = publishedTable(silent);
    expect(table.missed).toBe(2);
    expect(table.text).toMatch(/no answer/);
  });
});
