import fc from 'fast-check';

import {
  CONVENTIONAL_ABRASIVES,
  CONVENTIONAL_BONDS,
  GRAINS,
  parseMarking,
  writeMarking,
  type ConventionalMarking,
} from '@/shared/rules/marking';
import { explainMarking, gradeWord, isOrganicBond } from '@/shared/rules/marking-words';

const parsed = (text: string) => {
  const result = parseMarking(text);
  if (!result.ok) throw new Error(`${text} at ${result.position}: ${result.part}`);
  return result.marking;
};

const base: ConventionalMarking = {
  kind: 'conventional',
  prefix: null,
  abrasive: 'A',
  grainScale: null,
  grain: 60,
  grade: 'K',
  structure: 8,
  bond: 'V',
  suffix: null,
};

describe('reading the mark of a wheel', () => {
  it.each<[string, Partial<ConventionalMarking>]>([
    ['A 60 K 8 V', {}],
    ['A60K8V', {}],
    ['a60 k8v', {}],
    ['A-60-K-8-V', {}],
    ['A/F60 K 8 V', { grainScale: 'F' }],
    ['A #60 K 8 V', { grainScale: '#' }],
    ['A 60 K V', { structure: null }],
    ['38A60-K8VBE', { prefix: '38', suffix: 'BE' }],
    ['51-A-36-L-5-V-23', { prefix: '51', grain: 36, grade: 'L', structure: 5, suffix: '23' }],
    ['WA 46 J 16 V', { abrasive: 'WA', grain: 46, grade: 'J', structure: 16 }],
    ['GC 120 H 0 V', { abrasive: 'GC', grain: 120, grade: 'H', structure: 0 }],
    ['C36J8BF', { abrasive: 'C', grain: 36, grade: 'J', bond: 'BF' }],
    ['A 80 P RF', { grain: 80, grade: 'P', structure: null, bond: 'RF' }],
    ['A 80 P 4 Mg', { grain: 80, grade: 'P', structure: 4, bond: 'MG' }],
    ['A F1200 Z PL', { grainScale: 'F', grain: 1200, grade: 'Z', structure: null, bond: 'PL' }],
  ])('takes %j apart', (text, parts) => {
    expect(parseMarking(text)).toEqual({ ok: true, marking: { ...base, ...parts } });
  });

  it.each([
    ['', 0, 'abrasive'],
    ['X 60 K 8 V', 0, 'abrasive'],
    ['60 K 8 V', 3, 'abrasive'],
    ['A', 1, 'grain'],
    ['A K 8 V', 2, 'grain'],
    ['A 61 K 8 V', 2, 'grain'],
    ['A 6060 K 8 V', 2, 'grain'],
    ['A 60', 4, 'grade'],
    ['A 60 8 V', 5, 'grade'],
    ['A 60 K', 6, 'bond'],
    ['A 60 K 17 V', 7, 'structure'],
    ['A 60 K 8 X', 9, 'bond'],
    ['A 60 K 8', 8, 'bond'],
    ['A 60 K 8 V 35 m/s', 14, 'suffix'],
    ['D 127 R 100 B', 2, 'grain'],
    ['D 126 R 999 B', 8, 'concentration'],
    ['B 151 R 100 X', 12, 'bond'],
    ['38 D 126 C100 B', 3, 'abrasive'],
  ])('points at the fault in %j', (text, position, part) => {
    expect(parseMarking(text)).toEqual({ ok: false, position, part });
  });

  it.each([
    ['D126 R100 B', 126, 'µm', 'R', 100, 'B'],
    ['D126 C100 B', 126, 'µm', null, 100, 'B'],
    ['B151 V', 151, 'µm', null, null, 'V'],
    ['D 120 N 100 B', 120, 'mesh', 'N', 100, 'B'],
    ['d64c75m', 64, 'µm', null, 75, 'M'],
  ])('takes the superabrasive %j apart', (text, grain, grainScale, grade, concentration, bond) => {
    expect(parsed(text)).toMatchObject({ grain, grainScale, grade, concentration, bond });
  });

  it('reads back what it writes', () => {
    const anyMark = fc.record<ConventionalMarking>({
      kind: fc.constant('conventional'),
      prefix: fc.option(fc.integer({ min: 1, max: 999 }).map(String)),
      abrasive: fc.constantFrom(...CONVENTIONAL_ABRASIVES),
      grainScale: fc.constantFrom('F', '#', null),
      grain: fc.constantFrom(...GRAINS),
      grade: fc.constantFrom(...'ABCDEFGHIJKLMNOPQRSTUVWXYZ'),
      structure: fc.option(fc.integer({ min: 0, max: 16 })),
      bond: fc.constantFrom(...CONVENTIONAL_BONDS),
      suffix: fc.constantFrom(null, '23', '7X'),
    });
    fc.assert(
      fc.property(anyMark, (marking) => {
        expect(parseMarking(writeMarking(marking))).toEqual({ ok: true, marking });
      }),
    );
  });

  it('writes superabrasive marks so that they read back', () => {
    for (const text of ['D126 R C100 B', 'B151 V', 'D64 C75 M', 'D120 N C100 B 1/8'])
      expect(writeMarking(parsed(text))).toBe(text);
  });

  it('answers any text with parts or with a position inside it', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 40 }), (text) => {
        const result = parseMarking(text);
        return result.ok || (result.position >= 0 && result.position <= text.length);
      }),
      { numRuns: 2000 },
    );
  });
});

describe('explaining a mark', () => {
  it('names each part in order', () => {
    expect(explainMarking(parsed('38A60-K8VBE')).map(({ part, mark }) => [part, mark])).toEqual([
      ['abrasive', '38A'],
      ['grain', '60'],
      ['grade', 'K'],
      ['structure', '8'],
      ['bond', 'V'],
      ['suffix', 'BE'],
    ]);
  });

  it('says how coarse the grain is', () => {
    const word = (grain: number) => explainMarking({ ...base, grain })[1]?.means;
    expect([24, 30, 60, 70, 220, 230].map(word)).toEqual([
      'coarse grain',
      'medium grain',
      'medium grain',
      'fine grain',
      'fine grain',
      'very fine grain',
    ]);
  });

  it('says how much diamond there is', () => {
    const concentration = explainMarking(parsed('D126 C50 B')).find(
      ({ part }) => part === 'concentration',
    );
    expect(concentration?.means).toBe('2.2 carats in each cubic centimetre');
  });

  it('splits the grades at H and P', () => {
    expect(['A', 'H', 'I', 'P', 'Q', 'Z'].map(gradeWord)).toEqual([
      'soft',
      'soft',
      'medium',
      'medium',
      'hard',
      'hard',
    ]);
  });

  it('knows the bonds that do not ring', () => {
    const organic = CONVENTIONAL_BONDS.filter((bond) => isOrganicBond({ ...base, bond }));
    expect(organic).toEqual(['RF', 'BF', 'PL', 'E', 'R', 'B']);
    expect(isOrganicBond(parsed('D126 C100 B'))).toBe(true);
    expect(isOrganicBond(parsed('B151 V'))).toBe(false);
    expect(isOrganicBond(parsed('D126 M'))).toBe(false);
  });
});
