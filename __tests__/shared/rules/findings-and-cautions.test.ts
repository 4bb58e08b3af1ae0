import { CAUTION_SUBJECTS } from '@/shared/rules/caution';
import { CAUTIONS, cautionsFor } from '@/shared/rules/cautions';
import { FINDINGS, finding, findingWords } from '@/shared/rules/findings';
import { SOURCES } from '@/shared/rules/sources';
import { byGravity, verdictOf } from '@/shared/rules/verdict';

import { jawsInput, SMALL_WHEEL } from '../../support/plan-inputs';

const PROMISES = /\b(safe|safely|guarantee|guaranteed|optimal)\b/i;

describe.each(Object.entries(FINDINGS))('the finding %s', (code, entry) => {
  it('says what was found and what to do, promises nothing, and cites a source', () => {
    expect(entry.title).toMatch(/[.?]$/);
    expect(entry.remedy).toMatch(/\.$/);
    expect(`${entry.title} ${entry.remedy}`).not.toMatch(PROMISES);
    expect(SOURCES).toHaveProperty([entry.source]);
    expect(code).toMatch(/^[a-z]+(-[a-z]+)*$/);
  });
});

describe('finding words', () => {
  it('set figures in as the reader has them written, and names as they are', () => {
    const words = findingWords(
      finding('step-too-fast', {
        figures: { rpm: { value: 15_438, unit: 'rpm' }, limit: { value: 14_921, unit: 'rpm' } },
        names: { step: 'E', governs: 'marked rpm' },
      }),
      ({ value }) => `${value}!`,
    );
    expect(words.title).toBe(
      'Belt step E turns the wheel at 15438!, above the limit of 14921! (marked rpm).',
    );
  });
});

describe('the verdict', () => {
  const need = { part: 'work' as const, field: 'work.lengthMm', label: 'length' };
  const [stop, check, note] = [
    finding('wheel-scrapped'),
    finding('jaws-open'),
    finding('hand-traverse'),
  ];

  it('is Stop before incomplete, incomplete before Check, Check before Clear', () => {
    expect(verdictOf([note, check, stop], [need])).toBe('stop');
    expect(verdictOf([note, check], [need])).toBe('incomplete');
    expect(verdictOf([note, check], [])).toBe('check');
    expect(verdictOf([], [])).toBe('clear');
  });

  it('finds the gravest first', () => {
    expect(byGravity([note, check, stop, note])).toEqual([stop, check, note, note]);
  });

  it('is not coloured by notes', () => {
    expect(verdictOf([note], [])).toBe('clear');
  });
});

describe('cautions', () => {
  it('cover every subject, in the order of the Board', () => {
    const subjects = Object.values(CAUTIONS).map(({ subject }) => subject);
    expect([...new Set(subjects)]).toEqual([...CAUTION_SUBJECTS]);
  });

  it.each(Object.entries(CAUTIONS))('%s cites a source and promises nothing', (_, caution) => {
    expect(SOURCES).toHaveProperty([caution.source]);
    expect(caution.words).toMatch(/\.\)?$/);
    expect(caution.words).not.toMatch(PROMISES);
  });

  it('follow the wheel and the material', () => {
    const input = jawsInput();
    const mounted = {
      ...SMALL_WHEEL,
      mounted: { mandrelDiameterMm: 6, overhangMm: 13, threaded: false, makerMaximumRpm: 30_000 },
    };
    expect(cautionsFor(input)).toContain('look-and-ring');
    expect(cautionsFor({ ...input, wheelData: mounted })).toContain('mounted-overhang');
    expect(cautionsFor({ ...input, wheelData: mounted })).not.toContain('flanges-alike');
    expect(cautionsFor(input)).not.toContain('aluminium-dust');
    expect(
      cautionsFor({ ...input, work: { ...input.work, material: 'aluminium-alloy' } }),
    ).toContain('aluminium-dust');
  });
});
