import { expectedWords, judge, toleranceWords, type PublishedCase } from '@/shared/rules/published';
import { SOURCES } from '@/shared/rules/sources';

/** One test for each case; its name says what is checked, from where, and how far that can be trusted. */
export function checkPublished(cases: readonly PublishedCase[]): void {
  const named = cases.map((one): [string, string, PublishedCase] => {
    const { title, mark } = SOURCES[one.source];
    return [`${one.checks} (${one.inputs})`, `${title}; ${mark}`, one];
  });
  it.each(named)('%s is as in %s', (_checks, _source, one) => {
    // Everything the reader of a miss needs stands in the received object.
    expect({
      expected: expectedWords(one),
      within: toleranceWords(one),
      ...judge(one),
    }).toMatchObject({
      ok: true,
    });
  });
}
