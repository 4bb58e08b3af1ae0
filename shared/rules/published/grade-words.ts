import { gradeWord } from '../marking-words';
import { casesOf } from './case';

const ENDS: readonly [grade: string, word: string][] = [
  ['A', 'soft'],
  ['H', 'soft'],
  ['I', 'medium'],
  ['P', 'medium'],
  ['Q', 'hard'],
  ['Z', 'hard'],
];

export const gradeWords = casesOf(
  'memory-grade-words',
  ENDS.map(([grade, word]) => ({
    checks: 'How hard a grade is',
    inputs: `grade ${grade}`,
    expected: word,
    got: () => gradeWord(grade),
  })),
);
