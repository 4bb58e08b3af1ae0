import type { SourceMark } from '@/shared/rules/sources';

interface MarkWords {
  heading: string;
  /** How far a number with this mark can be trusted. */
  meaning: string;
}

export const MARKS: Record<SourceMark, MarkWords> = {
  law: {
    heading: 'Law',
    meaning: 'A regulation says so. Where several were read, the strictest holds.',
  },
  standard: {
    heading: 'Standard',
    meaning: 'A published standard says so: what makers and inspectors work to.',
  },
  handbook: {
    heading: 'Handbook',
    meaning: 'Printed in a handbook of the trade, as a table or a worked example.',
  },
  textbook: {
    heading: 'Textbook',
    meaning: 'Taught in an engineering textbook or a paper, with its derivation.',
  },
  derived: {
    heading: 'Derived',
    meaning: 'Follows from geometry or mechanics alone, and was checked numerically another way.',
  },
  'common practice': {
    heading: 'Common practice',
    meaning: 'The trade does it so. No text stands behind it.',
  },
  memory: {
    heading: 'Memory',
    meaning:
      'Recalled; the text itself was not seen. Trust it least. Where it is a shop setting, your shop can put its own value in its place.',
  },
  entered: {
    heading: 'Entered',
    meaning: 'What your shop typed in or measured.',
  },
};

export const counted = (count: number, one: string, many = `${one}s`): string =>
  `${count} ${count === 1 ? one : many}`;
