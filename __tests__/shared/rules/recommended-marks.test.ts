import fc from 'fast-check';

import { MATERIALS, type Material } from '@/shared/domain/materials';
import { GRAINS, parseMarking, type WheelMarking } from '@/shared/rules/marking';
import { markFindings, recommendedMark, scoreMark } from '@/shared/rules/recommended-marks';

const parsed = (text: string): WheelMarking => {
  const result = parseMarking(text);
  if (!result.ok) throw new Error(text);
  return result.marking;
};

const scoreOf = (text: string, material: Material, side: 'outside' | 'inside' = 'outside') =>
  scoreMark(parsed(text), material, recommendedMark(material, side, 50));

describe('how well a wheel suits the work', () => {
  it.each<[string, Material, 'outside' | 'inside']>([
    ['A 54 L 8 V', 'plain-carbon-annealed', 'outside'],
    ['A 60 M V', 'alloy-annealed', 'outside'],
    ['WA 60 K 8 V', 'tool-hardened', 'outside'],
    ['A 60 L 8 V', 'tool-hardened', 'inside'],
    ['C 36 J 8 V', 'cast-iron', 'outside'],
  ])('%s is as recommended for %s', (text, material, side) => {
    expect(scoreOf(text, material, side).score).toBe(100);
  });

  it('falls with each step of grain and grade, and says which way', () => {
    expect(scoreOf('A 54 K V', 'tool-hardened')).toMatchObject({ score: 95 });
    expect(scoreOf('A 54 K V', 'tool-hardened').reasons).toContain(
      'The grain is coarser than recommended.',
    );
    expect(scoreOf('A 60 M V', 'tool-hardened')).toMatchObject({ score: 90 });
    expect(scoreOf('A 60 M V', 'tool-hardened').reasons).toContain(
      'The grade is harder than recommended.',
    );
    expect(scoreOf('A 60 K B', 'tool-hardened').score).toBe(90);
    expect(scoreOf('C 60 K V', 'tool-hardened').score).toBe(60);
  });

  it('gives diamond nothing on steel and iron', () => {
    for (const material of MATERIALS) {
      const { score } = scoreOf('D126 C100 B', material);
      const ferrous = material !== 'copper-alloy' && material !== 'aluminium-alloy';
      if (ferrous) expect(score).toBe(0);
    }
  });

  it('lets cBN stand for aluminium oxide on hardened steel only', () => {
    expect(scoreOf('B126 C100 V', 'tool-hardened').score).toBe(50);
    expect(scoreOf('B126 C100 V', 'tool-annealed').score).toBe(10);
  });

  it('stays between nothing and a hundred', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...GRAINS),
        fc.constantFrom(...'ABCDEFGHIJKLMNOPQRSTUVWXYZ'),
        fc.constantFrom(...MATERIALS),
        (grain, grade, material) => {
          const { score } = scoreOf(`A ${grain} ${grade} V`, material);
          return score >= 0 && score <= 100;
        },
      ),
    );
  });

  it('changes wheels for hardened shafts above one inch', () => {
    expect(recommendedMark('alloy-hardened', 'outside', 25.4).grain.finest).toBe(80);
    expect(recommendedMark('alloy-hardened', 'outside', 25.41).grain.finest).toBe(60);
    expect(recommendedMark('alloy-hardened', 'outside', null).grain.finest).toBe(60);
  });
});

describe('what a mark gives away', () => {
  const codes = (text: string | null, material: Material | null) =>
    markFindings(text, material).map(({ code, level }) => [code, level]);

  it('is a check for diamond on steel, a note for an odd abrasive or an odd mark', () => {
    expect(codes('D126 C100 B', 'tool-hardened')).toEqual([['diamond-on-steel', 'check']]);
    expect(codes('C 60 K V', 'tool-hardened')).toEqual([['abrasive-other', 'note']]);
    expect(codes('A 61 K V', 'tool-hardened')).toEqual([['marking-not-read', 'note']]);
    expect(codes('A 60 K V', 'tool-hardened')).toEqual([]);
  });

  it('is nothing while mark or material is not known', () => {
    expect(codes(null, 'tool-hardened')).toEqual([]);
    expect(codes(' ', 'tool-hardened')).toEqual([]);
    expect(codes('C 60 K V', null)).toEqual([]);
  });
});
