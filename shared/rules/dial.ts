import type { LatheData } from '../domain/machines';
import { figure, floorTo, term } from './figures';
import { positive } from './sizes';
import type { Figure } from './types';

/** Half divisions are the finest a hand sets by eye. */
const FINEST_SHARE = 0.5;
/** Sines that make a tenth, and a tenth on diameter, of what the compound's dial reads. */
const TRADE_SINES = [0.1, 0.05];

/** What the slides of a lathe can be set to, on radius. */
export interface Dial {
  divisionMm: number;
  /** The smallest move that can be set: half a division. */
  stepMm: number;
  compoundDivisionMm: number | null;
}

/**
 * The cross-slide's dial on radius: a dial that reads diameter moves half of what it is marked.
 *
 * @param lathe - the lathe; null while not chosen.
 * @param compoundFree - false where the compound slide traverses, and so cannot also feed.
 * @returns the dial; null without a lathe.
 */
export function dialOf(lathe: LatheData | null, compoundFree = true): Dial | null {
  const marked = positive(lathe?.crossSlideDivisionMm ?? null);
  if (lathe === null || marked === null) return null;
  const divisionMm = lathe.crossSlideReads === 'diameter' ? marked / 2 : marked;
  return {
    divisionMm,
    stepMm: divisionMm * FINEST_SHARE,
    compoundDivisionMm: compoundFree ? positive(lathe.compoundDivisionMm) : null,
  };
}

/** An infeed as it can be set: its size, the step it is a multiple of, and how it is set. */
export interface Setting {
  infeedMm: number;
  stepMm: number;
  /** False where neither slide can set it. */
  settable: boolean;
  /** Divisions of the cross-slide dial; null when set otherwise. */
  divisions: number | null;
  /** The compound's angle from the spindle axis, where the cross-slide is too coarse. */
  compoundAngle: Figure | null;
}

/**
 * Rounds a wanted infeed down to what can be set: whole or half divisions of the cross-slide, or else whole
 * divisions of the compound slide set over, where s sin A is the move inwards. Half a cross-slide division
 * stands in when it is coarser than wanted but not above the ceiling and the compound cannot serve.
 *
 * @param wantedMm - infeed on radius, mm, over 0.
 * @param ceilingMm - the most that may be fed, mm.
 * @param dial - the lathe's dial; null sets the wanted infeed itself.
 * @returns the setting; its divisions are null where neither slide can set it, or no dial is known.
 * @source practice-dial
 * @example settle(0.0125, 0.05, dialOf(lathe)).infeedMm // 0.0125 mm
 */
export function settle(wantedMm: number, ceilingMm: number, dial: Dial | null): Setting {
  if (dial === null)
    return {
      infeedMm: wantedMm,
      stepMm: wantedMm,
      settable: true,
      divisions: null,
      compoundAngle: null,
    };
  const { divisionMm, stepMm, compoundDivisionMm } = dial;
  const onDial = floorTo(wantedMm, stepMm);
  if (onDial > 0) return byCrossSlide(onDial, dial);
  const angle = compoundAngle(wantedMm, compoundDivisionMm ?? divisionMm);
  if (compoundDivisionMm !== null && angle.value !== null) {
    const unit = compoundDivisionMm * Math.sin((angle.value * Math.PI) / 180);
    const fed = floorTo(wantedMm, unit);
    if (fed > 0)
      return { infeedMm: fed, stepMm: unit, settable: true, divisions: null, compoundAngle: angle };
  }
  if (stepMm <= ceilingMm + 1e-9) return { ...byCrossSlide(stepMm, dial), compoundAngle: angle };
  return {
    infeedMm: wantedMm,
    stepMm: wantedMm,
    settable: false,
    divisions: null,
    compoundAngle: angle,
  };
}

function byCrossSlide(infeedMm: number, { divisionMm, stepMm }: Dial): Setting {
  return {
    infeedMm,
    stepMm,
    settable: true,
    divisions: infeedMm / divisionMm,
    compoundAngle: null,
  };
}

/**
 * The angle from the spindle axis at which one division of the compound slide moves the tool in by little enough.
 *
 * @param wantedMm - move inwards, mm, over 0.
 * @param divisionMm - one division of the compound slide, mm.
 * @returns degrees: 5 deg 44 min (a tenth) or 2 deg 52 min (a twentieth) where one of them serves.
 * @source lautard
 * @example compoundAngle(0.0025, 0.025).value // 5.739
 */
export function compoundAngle(wantedMm: number, divisionMm: number): Figure {
  return figure({
    unit: 'deg',
    formula: '{A} = asin({a} / {c})',
    source: 'lautard',
    terms: [
      term('a', 'move inwards for one division', [
        sineFor(wantedMm / divisionMm) * divisionMm,
        'mm',
      ]),
      term('c', 'one division of the compound slide', [divisionMm, 'mm']),
    ],
    compute: (move, division) => (Math.asin(move / division) * 180) / Math.PI,
    note: 'From the spindle axis. Take up backlash in the same direction each time.',
  });
}

function sineFor(most: number): number {
  return TRADE_SINES.find((sine) => sine <= most + 1e-9) ?? Math.min(most, 1);
}
