import type { QuillData } from '../domain/machines';
import type { WheelData } from '../domain/wheels';
import { MM_PER_INCH } from '../units/constants';
import { finding } from './findings';
import { quantity } from './figures';
import { wheelSpeed } from './speed';
import { limitRpm, rpmOfMarkedSpeed, wheelLimits } from './limits';
import type { Finding } from './types';

/** One state rule exempts wheels up to this diameter from ringing: their sound proves nothing. */
const RINGING_FROM_MM = 4 * MM_PER_INCH;
/**
 * The most a hole may be larger than its seat. Holes are made to the wide grades H11 to H13 (0.13 to 0.33 mm
 * at 13 to 32 mm, from memory), so a quarter of a millimetre is a free fit; half an inch on 12 mm is not.
 */
const FREE_FIT_MM = 0.25;
const SAME_SIZE_MM = 0.005;
const SLACK_MM = 1e-9;
/** Marked rpm and m/s are rounded on a wheel; beyond this they say different things. */
const ROUNDING_OF_MARKS = 0.02;

/** What a wheel's marking, state and tests say against running it. */
export interface WheelUse {
  wheel: WheelData;
  quill: QuillData | null;
  /** Rubber, resin, shellac and plastic do not ring; null where the marking does not tell. */
  organicBond: boolean | null;
  /** Answers of a wheel that is being typed in are asked for, not held against it. */
  typed: boolean;
  /** ISO date of the shop. */
  today: string;
}

/**
 * Whether this wheel may be mounted at all: marked, on the rack, sound to eye and ear, in date, fitting.
 *
 * @param use - wheel, quill, bond and the shop's date.
 * @returns findings, none when nothing speaks against the wheel.
 * @source osha-1910-215-d1
 * @example wheelFindings({ wheel, quill, organicBond: false, typed: false, today: '2026-03-02' }) // []
 */
export function wheelFindings(use: WheelUse): Finding[] {
  const { wheel, quill, typed, today } = use;
  return [
    ...markingFindings(wheel, typed),
    ...stateFindings(wheel, today),
    ...lookFindings(wheel, typed),
    ...ringFindings(use),
    ...(wheel.diameterNowMm > wheel.diameterNewMm
      ? [
          finding('wheel-grown', {
            figures: {
              now: quantity(wheel.diameterNowMm, 'mm'),
              fresh: quantity(wheel.diameterNewMm, 'mm'),
            },
          }),
        ]
      : []),
    ...wornFindings(wheel),
    ...(quill === null ? [] : fitFindings(wheel, quill.seatDiameterMm)),
  ];
}

/**
 * Unmarked, or marked in two ways that disagree.
 *
 * @param wheel - its marking.
 * @param typed - whether it is being typed in, so that a missing mark is asked for instead.
 * @returns findings.
 */
export function markingFindings(
  wheel: Pick<WheelData, 'markedRpm' | 'markedSpeedMPerS' | 'diameterNewMm' | 'mounted'>,
  typed: boolean,
): Finding[] {
  const found: Finding[] = [];
  const limits = wheelLimits(wheel);
  if (limits.some(({ kind }) => kind === 'unmarked') && !typed)
    found.push(finding('unmarked-wheel'));
  if (limits.some((limit) => limit.kind === 'maker, mounted' && limitRpm(limit) === 0))
    found.push(finding('mounted-no-figure'));
  const { markedRpm, markedSpeedMPerS, diameterNewMm } = wheel;
  const bySpeed = rpmOfMarkedSpeed(markedSpeedMPerS, diameterNewMm).value;
  const rpmSpeed = wheelSpeed(diameterNewMm, markedRpm).value;
  if (
    markedRpm !== null &&
    markedSpeedMPerS !== null &&
    bySpeed !== null &&
    rpmSpeed !== null &&
    Math.abs(bySpeed / markedRpm - 1) > ROUNDING_OF_MARKS
  )
    found.push(
      finding('markings-disagree', {
        figures: { rpm: quantity(markedRpm, 'rpm'), speed: quantity(markedSpeedMPerS, 'm/s') },
      }),
    );
  return found;
}

function stateFindings(wheel: WheelData, today: string): Finding[] {
  const found: Finding[] = [];
  if (wheel.state === 'set aside')
    found.push(
      finding('wheel-set-aside', { names: { reason: wheel.setAsideReason ?? 'no reason given' } }),
    );
  if (wheel.state === 'scrapped') found.push(finding('wheel-scrapped'));
  if (wheel.unsigned) found.push(finding('wheel-unsigned'));
  if (wheel.expiresOn !== null && wheel.expiresOn < today)
    found.push(finding('wheel-expired', { names: { date: wheel.expiresOn } }));
  return found;
}

function lookFindings({ looked }: WheelData, typed: boolean): Finding[] {
  if (looked === 'damaged') return [finding('wheel-damaged')];
  return looked === null && !typed ? [finding('wheel-not-looked-at')] : [];
}

/** Mounted wheels are gripped by their mandrel and cannot be rung: the look alone counts. */
function ringFindings({ wheel, organicBond, typed }: WheelUse): Finding[] {
  if (wheel.rung === 'dull') return [finding('ring-dull')];
  if (wheel.rung === 'clear' || wheel.mounted !== null) return [];
  if (wheel.rung === null) return typed ? [] : [finding('ring-missing')];
  const small = wheel.diameterNowMm <= RINGING_FROM_MM + 1e-9;
  return small || organicBond === true
    ? [finding('ring-silent')]
    : [
        finding('ring-silent-large', {
          figures: { diameter: quantity(wheel.diameterNowMm, 'mm') },
        }),
      ];
}

function wornFindings({ diameterNowMm, smallestUsableMm }: WheelData): Finding[] {
  if (smallestUsableMm === null || !isBelow(diameterNowMm, smallestUsableMm)) return [];
  const figures = {
    now: quantity(diameterNowMm, 'mm'),
    smallest: quantity(smallestUsableMm, 'mm'),
  };
  return [finding('wheel-worn-out', { figures })];
}

/**
 * Whether a diameter is below a smallest one, beyond what repeated subtraction can be off by.
 *
 * @param diameterMm - mm.
 * @param smallestMm - mm.
 * @returns true when it is.
 * @source none: a matter of arithmetic
 * @example isBelow(25 - 0.1 - 0.1 - 0.1, 24.7) // false
 */
export function isBelow(diameterMm: number, smallestMm: number): boolean {
  return diameterMm < smallestMm - SLACK_MM;
}

/**
 * The hole, or the mandrel of a mounted wheel, against the seat or collet.
 *
 * @param wheel - the wheel, mm.
 * @param seatMm - diameter of the seat or the collet's bore, mm.
 * @returns a Stop where the wheel does not go on or would sit loose.
 * @source cal-t8-3580
 * @example fitFindings(wheel, quill.seatDiameterMm) // []
 */
export function fitFindings(wheel: WheelData, seatMm: number): Finding[] {
  const figures = (hole: number) => ({
    hole: quantity(hole, 'mm'),
    seat: quantity(seatMm, 'mm'),
  });
  if (wheel.mounted !== null) {
    const mandrel = wheel.mounted.mandrelDiameterMm;
    if (mandrel > seatMm + SAME_SIZE_MM)
      return [finding('mandrel-too-thick', { figures: figures(mandrel) })];
    return mandrel < seatMm - FREE_FIT_MM
      ? [finding('mandrel-too-thin', { figures: figures(mandrel) })]
      : [];
  }
  if (wheel.holeMm < seatMm - SAME_SIZE_MM)
    return [finding('hole-too-small', { figures: figures(wheel.holeMm) })];
  return wheel.holeMm > seatMm + FREE_FIT_MM
    ? [finding('hole-too-large', { figures: figures(wheel.holeMm) })]
    : [];
}
