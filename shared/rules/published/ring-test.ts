import { convertUnit } from '../../units/entry-units';
import type { RingResult } from '../../domain/wheels';
import { verdictOf } from '../verdict';
import { wheelFindings } from '../wheel-checks';
import { casesOf } from './case';
import { PLAIN_WHEEL } from './wheel';

function verdict(rung: RingResult | null, inches: number) {
  const diameterMm = convertUnit(inches, 'in', 'mm');
  const wheel = { ...PLAIN_WHEEL, rung, diameterNewMm: diameterMm, diameterNowMm: diameterMm };
  return verdictOf(
    wheelFindings({ wheel, quill: null, organicBond: false, typed: false, today: '2026-01-01' }),
    [],
  );
}

const note = 'The law asks for the test; the verdict is how the rules say so.';

export const ringTest = [
  ...casesOf('osha-1910-215-d1', [
    {
      checks: 'A wheel that was not rung before mounting',
      inputs: 'vitrified, 6 in, no ring test',
      note,
      expected: 'stop',
      got: () => verdict(null, 6),
    },
    {
      checks: 'A wheel that rings dull',
      inputs: 'vitrified, 6 in, dull',
      note,
      expected: 'stop',
      got: () => verdict('dull', 6),
    },
    {
      checks: 'A wheel that rings clear',
      inputs: 'vitrified, 6 in, clear',
      note,
      expected: 'clear',
      got: () => verdict('clear', 6),
    },
  ]),
  ...casesOf('miosha-408-10113', [
    {
      checks: 'A small wheel may stay silent: the look counts',
      inputs: 'vitrified, 4 in, silent, looked at',
      note,
      expected: 'clear',
      got: () => verdict('silent', 4),
    },
    {
      checks: 'A larger wheel may not',
      inputs: 'vitrified, 4.1 in, silent, looked at',
      note,
      expected: 'stop',
      got: () => verdict('silent', 4.1),
    },
  ]),
];
