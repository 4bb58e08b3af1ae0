import { clearanceFindings } from '../clearance';
import { casesOf } from './case';
import { PLAIN_WHEEL } from './wheel';

/** What is said of a wheel in a bore of 100 mm. */
function said(wheelMm: number): string {
  const [found] = clearanceFindings({
    boreMm: 100,
    lengthMm: null,
    overrunMm: null,
    clearDepthMm: null,
    wheel: { ...PLAIN_WHEEL, diameterNowMm: wheelMm },
    quill: null,
  });
  if (found === undefined) return 'usual';
  return found.code === 'wheel-large-for-bore' ? 'large' : 'small';
}

const SHARES: readonly [share: string, wheelMm: number, answer: string][] = [
  ['0.49', 49, 'small'],
  ['0.5', 50, 'usual'],
  ['0.7', 70, 'usual'],
  ['0.9', 90, 'usual'],
  ['0.91', 91, 'large'],
];

export const commonPracticeBoreWheel = casesOf(
  'practice-bore-wheel',
  SHARES.map(([share, wheelMm, answer]) => ({
    checks: 'Wheel for a bore: 0.5 to 0.9 of it',
    inputs: `wheel ${share} of the bore`,
    expected: answer,
    got: () => said(wheelMm),
  })),
);
