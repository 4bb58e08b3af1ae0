import { toRadians } from './angles';
import { figure, term } from './figures';
import { highSpot, offsetAt, tiltOver, type OffsetLine } from './offset';
import type { Figure, JawContact, JawPlan } from './types';

/** How much further than its fellows a pad stands from the axis, mm; worn pads have more at the front. */
export interface PadError {
  backMm: number;
  frontMm: number;
}

export interface JawChuck {
  /** Jaws equally spaced, the first at 0 degrees. */
  jawCount: number;
  /** Diameter at which the pads stand on their preload and are ground. */
  boreMm: number;
  /** Width across one pad; 0 for jaws that touch along a line. */
  padWidthMm: number;
  /** Distances along the axis of the two ends of the pads, from where the offset was measured. */
  padBackMm: number;
  padFrontMm: number;
  /** Diameter at which the pads were last ground; null when not known, and then taken as the bore. */
  lastGroundMm: number | null;
  offset: OffsetLine;
  /** One for each jaw, in order; a jaw without one has none. */
  padErrors: readonly PadError[];
}

/** Where on one pad the wheel meets it first and last: radius of the wheel's outermost path, mm. */
interface PadReach {
  firstMm: number;
  lastMm: number;
}

const ARC_STEPS = 48;
const BISECTIONS = 40;

/**
 * How chuck jaws come into contact as they are ground from inside, and how much must come off until every
 * pad is clean to the back.
 *
 * The jaws sit off the spindle axis by the offset, so one touches first and another last. To the first
 * order in offset over radius; the jaws are taken to stand still under the grinding preload.
 *
 * @param chuck - jaws, pads, offset and the pads' own errors, mm and degrees.
 * @returns order of contact, clean-up stock on radius and tilt, unrounded; null when there are fewer than two
 * jaws or the pads are wider than the bore, now or when they were last ground.
 * @source derived-jaw-contact
 * @example planJaws({ jawCount: 3, boreMm: 60, padWidthMm: 0, padBackMm: 0, padFrontMm: 40, lastGroundMm: null, offset: { at0: { aMm: 0.05, bMm: 0 }, perMm: { aMm: 0, bMm: 0 } }, padErrors: [] })?.cleanUp.value // 0.075 mm
 */
export function planJaws(chuck: JawChuck): JawPlan | null {
  const radiusMm = chuck.boreMm / 2;
  const narrowest = Math.min(chuck.boreMm, chuck.lastGroundMm ?? chuck.boreMm);
  if (chuck.jawCount < 2 || !(radiusMm > 0) || chuck.padWidthMm > narrowest) return null;
  const angles = Array.from({ length: chuck.jawCount }, (_, jaw) => (360 * jaw) / chuck.jawCount);
  const reaches = angles.map((angleDeg, jaw) => padReach(chuck, angleDeg, jaw));
  const first = Math.min(...reaches.map(({ firstMm }) => firstMm));
  const last = Math.max(...reaches.map(({ lastMm }) => lastMm));
  const widest = widestOffset(chuck);
  return {
    contacts: contacts(angles, reaches, first),
    firstContactDiameterMm: 2 * (radiusMm + first),
    cleanUp: cleanUp({ first: radiusMm + first, last: radiusMm + last }, chuck.lastGroundMm),
    eccentricityMm: widest.eccentricityMm,
    highSpotDeg: widest.highSpotDeg,
    tilt: tiltOver(chuck.offset, Math.abs(chuck.padFrontMm - chuck.padBackMm)),
  };
}

/**
 * The errors of pads that are all worn alike at the front, as loose jaws are.
 *
 * @param jawCount - how many jaws, 2 or more.
 * @param bellMouthMm - how far the pads are worn back at the front, on radius, mm, 0 or more.
 * @returns one error for each jaw.
 * @source practice-jaw-preload
 * @example bellMouth(2, 0.02) // [{ backMm: 0, frontMm: 0.02 }, { backMm: 0, frontMm: 0.02 }]
 */
export function bellMouth(jawCount: number, bellMouthMm: number): PadError[] {
  return Array.from({ length: jawCount }, () => ({ backMm: 0, frontMm: bellMouthMm }));
}

/** Both ends decide: for any point across the pad the distance from the axis is a straight line along it. */
function padReach(chuck: JawChuck, angleDeg: number, jaw: number): PadReach {
  const { backMm, frontMm } = chuck.padErrors[jaw] ?? { backMm: 0, frontMm: 0 };
  const back = acrossPad(chuck, angleDeg, { zMm: chuck.padBackMm, errorMm: backMm });
  const front = acrossPad(chuck, angleDeg, { zMm: chuck.padFrontMm, errorMm: frontMm });
  return {
    firstMm: Math.min(back.firstMm, front.firstMm),
    lastMm: Math.max(back.lastMm, front.lastMm),
  };
}

/**
 * The nearest and the furthest point of a pad at one place along it, as distances beyond the bore's radius. A
 * pad's error shifts it along its own direction, the offset along its own.
 */
function acrossPad(
  chuck: JawChuck,
  angleDeg: number,
  { zMm, errorMm }: { zMm: number; errorMm: number },
): PadReach {
  const radiusMm = chuck.boreMm / 2;
  const { aMm, bMm } = offsetAt(chuck.offset, zMm);
  const bow = bowOf(radiusMm, (chuck.lastGroundMm ?? chuck.boreMm) / 2);
  const middle = toRadians(angleDeg);
  const half = Math.asin(chuck.padWidthMm / chuck.boreMm);

  const distance = (d: number) =>
    aMm * Math.cos(middle + d) +
    bMm * Math.sin(middle + d) +
    errorMm * Math.cos(d) +
    bow.height(radiusMm * Math.sin(d));
  const slope = (d: number) =>
    bMm * Math.cos(middle + d) -
    aMm * Math.sin(middle + d) -
    errorMm * Math.sin(d) +
    bow.slope(radiusMm * Math.sin(d)) * radiusMm * Math.cos(d);

  const candidates = [-half, half, ...turningPoints(slope, half)].map(distance);
  return { firstMm: Math.min(...candidates), lastMm: Math.max(...candidates) };
}

/**
 * How far a pad last ground at another radius stands beyond the bore, w mm from its middle: about
 * w²/2 (1/R - 1/R_old). Nothing when both radii are the same.
 */
function bowOf(radiusMm: number, lastRadiusMm: number) {
  const apart = radiusMm - lastRadiusMm;
  const down = (w: number) => Math.sqrt(lastRadiusMm ** 2 - w ** 2);
  const fromAxis = (w: number) => Math.hypot(apart + down(w), w);
  return {
    height: (w: number) => (apart === 0 ? 0 : fromAxis(w) - radiusMm),
    slope: (w: number) => (apart === 0 ? 0 : (-apart * w) / (fromAxis(w) * down(w))),
  };
}

/** Where the slope changes sign between -half and half. */
function turningPoints(slope: (angle: number) => number, half: number): number[] {
  const found: number[] = [];
  for (let step = 0; step < ARC_STEPS; step += 1) {
    let low = half * ((2 * step) / ARC_STEPS - 1);
    let high = half * ((2 * (step + 1)) / ARC_STEPS - 1);
    const rising = slope(low) < 0;
    if (rising === slope(high) < 0) continue;
    for (let turn = 0; turn < BISECTIONS; turn += 1) {
      const between = (low + high) / 2;
      if (slope(between) < 0 === rising) low = between;
      else high = between;
    }
    found.push((low + high) / 2);
  }
  return found;
}

function contacts(angles: number[], reaches: PadReach[], first: number): JawContact[] {
  const ranked = reaches.map(({ firstMm }, jaw) => ({
    nanometres: Math.round(firstMm * 1e6),
    jaw,
  }));
  ranked.sort((one, other) => one.nanometres - other.nanometres || one.jaw - other.jaw);
  return reaches.map(({ firstMm, lastMm }, jaw) => ({
    jaw: jaw + 1,
    angleDeg: angles[jaw] ?? 0,
    touchesAtMm: firstMm - first,
    cleanAtMm: lastMm - first,
    order: ranked.findIndex((entry) => entry.jaw === jaw) + 1,
  }));
}

function cleanUp(radius: { first: number; last: number }, lastGroundMm: number | null): Figure {
  return figure({
    unit: 'mm',
    formula: '{Δr} = {r_last} - {r_first}',
    source: 'derived-jaw-contact',
    terms: [
      term('r_last', 'path of the wheel at which the last pad is clean', [radius.last, 'mm']),
      term('r_first', 'path of the wheel at the first touch', [radius.first, 'mm']),
    ],
    compute: (last, first) => last - first,
    note:
      lastGroundMm === null
        ? 'An estimate, with the pads taken as last ground at this diameter: touch each jaw again under the grinding preload.'
        : 'An estimate: the run-out was read under another preload, so touch each jaw again under the grinding preload.',
  });
}

/** The end of the pads at which the offset is larger. */
function widestOffset(chuck: JawChuck): { eccentricityMm: number; highSpotDeg: number } {
  const at = (zMm: number) => {
    const offset = offsetAt(chuck.offset, zMm);
    return { eccentricityMm: Math.hypot(offset.aMm, offset.bMm), highSpotDeg: highSpot(offset) };
  };
  const [back, front] = [at(chuck.padBackMm), at(chuck.padFrontMm)];
  return back.eccentricityMm > front.eccentricityMm ? back : front;
}
