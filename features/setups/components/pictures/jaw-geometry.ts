import { arc } from 'd3-shape';

import { polar, type Point } from '@/features/ui/polar';
import type { JawContact, JawPlan } from '@/shared/rules/types';

const ROUND = [1, 1.5, 2, 3, 4, 5, 6, 8];
const NICE = [1, 10, 100, 1000].flatMap((decade) => ROUND.map((step) => step * decade));
/** The largest gap is drawn about this share of the bore's radius. */
const GAP_SHARE = 0.38;
const FACE_POINTS = 12;

/** How many times too large gaps are drawn, so that the largest of them is plainly seen; a round number. */
export function exaggeration(plans: readonly JawPlan[], boreMm: number): number {
  const largest = Math.max(
    ...plans.flatMap((plan) => [
      plan.eccentricityMm,
      ...plan.contacts.map((contact) => contact.touchesAtMm),
    ]),
  );
  if (!(largest > 0)) return 1;
  const wanted = (GAP_SHARE * boreMm) / 2 / largest;
  return NICE.filter((times) => times <= wanted).at(-1) ?? 1;
}

/** Where everything stands in a drawing of a given width. */
export interface ChuckLayout {
  centre: Point;
  /** Ends of the jaws, edge of the chuck's face, and the wheel's path at the first touch, in pixels. */
  outerRadius: number;
  faceRadius: number;
  pathRadius: number;
  height: number;
}

const MOST_FULL_LABELS = 3;
const ROOM_FOR_LABELS = 240;

/** Many jaws, or large words in a narrow place: the jaws carry their numbers alone, the list says the rest. */
export const hasFullLabels = (plan: JawPlan, width: number, textScale: number) =>
  plan.contacts.length <= MOST_FULL_LABELS && width / textScale >= ROOM_FOR_LABELS;

const OUTER_SHARE = 0.43;
const FACE_SHARE = 0.82;
const PATH_SHARE = 0.52;

/** Leaves room for words above the top jaw and under the lowest end, and no more. */
export function chuckLayout(width: number, plan: JawPlan, textScale: number): ChuckLayout {
  const outerRadius = width * OUTER_SHARE;
  const lowest = Math.max(
    FACE_SHARE,
    ...plan.contacts.map(({ angleDeg }) => -Math.cos((angleDeg * Math.PI) / 180)),
  );
  const margin = (hasFullLabels(plan, width, textScale) ? 8 : 18) * textScale;
  const centre = { x: width / 2, y: margin + outerRadius };
  return {
    centre,
    outerRadius,
    faceRadius: outerRadius * FACE_SHARE,
    pathRadius: outerRadius * PATH_SHARE,
    height: centre.y + outerRadius * lowest + 18 * textScale,
  };
}

interface JawSpec {
  plan: JawPlan;
  contact: JawContact;
  layout: ChuckLayout;
  /** How many times too large offsets are drawn. */
  times: number;
  boreMm: number;
  padWidthMm: number;
}

export const pixelsPerMm = ({ pathRadius }: ChuckLayout, boreMm: number) =>
  pathRadius / (boreMm / 2);

/** The outline of one jaw: its face stands off the wheel's path by the gap that the plan gives it. */
export function jawOutline(spec: JawSpec): string {
  const { plan, contact, layout } = spec;
  const { centre, pathRadius, outerRadius } = layout;
  const offsetScale = pixelsPerMm(layout, spec.boreMm) * spec.times;
  const half = halfAngleDeg(spec.boreMm, spec.padWidthMm, plan.contacts.length);
  const halfWidth = Math.max(pathRadius * Math.sin((half * Math.PI) / 180), 2);
  const reach = (turn: number) =>
    offsetScale *
    plan.eccentricityMm *
    Math.cos(((contact.angleDeg + turn - plan.highSpotDeg) * Math.PI) / 180);
  const turns = Array.from(
    { length: FACE_POINTS + 1 },
    (_, index) => half * ((2 * index) / FACE_POINTS - 1),
  );
  const nearest = Math.min(...turns.map(reach));
  const across = (contact.angleDeg * Math.PI) / 180;
  /** A point of the jaw by its distance along the jaw and across it. */
  const at = (along: number, sideways: number): Point => {
    const middle = polar(centre, along, contact.angleDeg);
    return {
      x: middle.x + sideways * Math.cos(across),
      y: middle.y + sideways * Math.sin(across),
    };
  };
  // Distances from the axis are true; the pad keeps its width however far it stands off.
  const face = turns.map((turn) => {
    const distance = pathRadius + offsetScale * contact.touchesAtMm + reach(turn) - nearest;
    const sideways = halfWidth * (turn / half);
    return at(Math.sqrt(Math.max(distance ** 2 - sideways ** 2, 0)), sideways);
  });
  const points = [...face, at(outerRadius, halfWidth), at(outerRadius, -halfWidth)];
  return `M${points.map(({ x, y }) => `${x.toFixed(1)},${y.toFixed(1)}`).join('L')}Z`;
}

/** Pads are drawn no wider than lets neighbours stand apart. */
function halfAngleDeg(boreMm: number, padWidthMm: number, jaws: number): number {
  const half = (Math.asin(Math.min(padWidthMm / boreMm, 1)) * 180) / Math.PI;
  return Math.min(Math.max(half, 1), 160 / jaws);
}

/** The chuck's face: a ring between two radii round a centre. */
export const ring = (inner: number, outer: number): string =>
  arc()({ innerRadius: inner, outerRadius: outer, startAngle: 0, endAngle: 2 * Math.PI }) ?? '';
