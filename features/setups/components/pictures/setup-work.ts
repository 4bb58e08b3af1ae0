import type { Point } from '@/features/ui/polar';
import type { Plan, PlanInput } from '@/shared/rules';
import type { Surface } from '@/shared/rules/surface';

import type { Dimension, Shape } from './setup-scene';

/** Along the ground surface, from its end at the headstock, and away from it towards the wheel. */
export interface Path {
  /** Length along the surface, and where the wheel's outer faces come to at both ends of its stroke, mm. */
  lengthMm: number;
  fromMm: number;
  toMm: number;
  /** Diameters of the surface at the headstock's and the tailstock's end. */
  headMm: number;
  tailMm: number;
  largestMm: number;
  alongAxisMm: number;
  /** The compound carries the wheel along a cone. */
  tilted: boolean;
  /** Null for cylinders. */
  halfAngleDeg: number | null;
  at: (along: number, away: number) => Point;
  box: (along: [number, number], away: [number, number]) => Point[];
  /** A point of the work by its place along its own axis and off it. */
  onWork: (x: number, y: number) => Point;
  axis: (left: number, right: number) => [Point, Point];
  overruns: Dimension[];
}

interface Work {
  shapes: Shape[];
  dimensions: Dimension[];
}

/** Hints of walls, chuck and centres, as shares of the work's diameter. */
const WALL_SHARE = 0.16;
const CHUCK = { length: 0.35, half: 0.85 };
const CENTRE_SHARE = 0.25;
const CENTRE_HALF_ANGLE = Math.PI / 6;

/** The way of the wheel along the surface; null while length, diameter or angle is not known. */
export function pathOf({ work, wheelData }: PlanInput, surface: Surface, plan: Plan): Path | null {
  const { lengthMm, diameterMm, cone, side } = surface;
  if (lengthMm === null || diameterMm === null) return null;
  const halfAngleDeg = cone?.half.value ?? null;
  const small = cone === null ? diameterMm : cone.smallDiameter.value;
  if (small === null) return null;
  const half = ((halfAngleDeg ?? 0) * Math.PI) / 180;
  const outside = side === 'outside';
  // The wide end of a shaft's cone is at the headstock; a bore's cone opens towards the tailstock.
  const [headMm, tailMm] = outside
    ? [diameterMm, Math.max(small, 0)]
    : [Math.max(small, 0), diameterMm];
  const overBed = cone !== null && surface.slide === 'carriage';
  const slope = overBed ? 0 : outside ? -half : half;
  const away = outside ? 1 : -1;
  const start = { x: 0, y: headMm / 2 };
  const at = (along: number, off: number): Point => ({
    x: start.x + along * Math.cos(slope) - away * off * Math.sin(slope),
    y: start.y + along * Math.sin(slope) + away * off * Math.cos(slope),
  });
  const turn = overBed ? (outside ? half : -half) : 0;
  const onWork = (x: number, y: number): Point => ({
    x: start.x + (x - start.x) * Math.cos(turn) - (y - start.y) * Math.sin(turn),
    y: start.y + (x - start.x) * Math.sin(turn) + (y - start.y) * Math.cos(turn),
  });
  const past = plan.traverse.overrun.value ?? 0;
  // One shoulder is taken to stand at the headstock's end, where it usually is.
  const [pastHead, pastTail] = [surface.shoulders > 0 ? 0 : past, surface.shoulders > 1 ? 0 : past];
  const fromMm = -pastHead;
  const widthMm = wheelData?.widthMm ?? 0;
  const toMm = plan.traverse.plunge ? fromMm + widthMm : lengthMm + pastTail;
  const overruns: Dimension[] = (
    [
      [fromMm, 0],
      [lengthMm, toMm],
    ] as const
  )
    .filter(([from, to]) => to > from)
    .map(([from, to]) => ({ name: 'overrun', mm: to - from, from, to }));
  const tilted = slope !== 0;
  return {
    lengthMm,
    fromMm,
    toMm,
    headMm,
    tailMm,
    largestMm: diameterMm,
    alongAxisMm: work.lengthMm ?? lengthMm,
    tilted,
    halfAngleDeg,
    at,
    box: ([from, to], [near, far]) => [at(from, near), at(to, near), at(to, far), at(from, far)],
    onWork,
    axis: (left, right) => [onWork(left, 0), onWork(right, 0)],
    overruns: tilted ? [] : overruns,
  };
}

/** A shaft or an outside cone, with what holds it hinted at. */
export function outsideWork({ work }: PlanInput, path: Path): Work {
  const { alongAxisMm: length, headMm, tailMm, onWork } = path;
  const free = work.unsupportedLengthMm;
  const known = free !== null && free >= length ? free : null;
  const between = work.holding === 'centres';
  // Nobody is asked where the surface lies between the centres: it is drawn midway.
  const from = known === null ? 0 : between ? (length - known) / 2 : length - known;
  const to = known !== null && between ? from + known : length;
  const body = [
    [from, headMm],
    [0, headMm],
    [length, tailMm],
    [to, tailMm],
  ] as const;
  const shapes: Shape[] = [
    {
      kind: 'work',
      points: [
        ...body.map(([x, across]) => onWork(x, -across / 2)),
        ...[...body].reverse().map(([x, across]) => onWork(x, across / 2)),
      ],
    },
  ];
  if (known !== null && !between && work.holding !== null)
    shapes.unshift({
      kind: 'hint',
      points: boxOn(onWork, [from - headMm * CHUCK.length, from], headMm * CHUCK.half),
    });
  if (between && known !== null) shapes.push(centre(onWork, { x: from, across: headMm, side: -1 }));
  if (between || work.holding === 'chuck and centre')
    if (tailMm > 0) shapes.push(centre(onWork, { x: to, across: tailMm, side: 1 }));
  const dimensions: Dimension[] = [ground(path), ...path.overruns];
  if (known !== null)
    dimensions.push({
      name: between ? 'between centres' : 'free length',
      mm: known,
      from: onWork(from, 0).x,
      to: onWork(to, 0).x,
    });
  return { shapes, dimensions };
}

/** A bore, an inside cone or the pads of jaws, cut open along the axis; the outer wall is only hinted at. */
export function insideWork({ operation, work }: PlanInput, path: Path): Work {
  const { alongAxisMm: length, headMm, tailMm, onWork, largestMm } = path;
  const wall = largestMm * WALL_SHARE;
  const outer = largestMm / 2 + wall;
  const shapes: Shape[] = [-1, 1].map((side) => ({
    kind: 'section',
    points: [
      onWork(0, (side * headMm) / 2),
      onWork(length, (side * tailMm) / 2),
      onWork(length, side * outer),
      onWork(0, side * outer),
    ],
  }));
  const clear = operation === 'bore' && work.throughBore === true ? null : work.clearDepthMm;
  if (clear !== null)
    shapes.push({ kind: 'hint', points: boxOn(onWork, [-clear - wall, -clear], outer) });
  const dimensions: Dimension[] = [ground(path), ...path.overruns];
  if (clear !== null && clear > 0)
    dimensions.push({ name: 'free depth', mm: clear, from: -clear, to: 0 });
  return { shapes, dimensions };
}

/** Along the bed, as a drawing of the work gives it. */
function ground({ at, lengthMm }: Path): Dimension {
  const to = at(lengthMm, 0).x;
  return { name: 'ground', mm: to, from: 0, to };
}

const boxOn = (onWork: Path['onWork'], [from, to]: [number, number], half: number): Point[] => [
  onWork(from, -half),
  onWork(to, -half),
  onWork(to, half),
  onWork(from, half),
];

/** The point of a 60-degree centre. */
function centre(
  onWork: Path['onWork'],
  { x, across, side }: { x: number; across: number; side: -1 | 1 },
): Shape {
  const half = across * CENTRE_SHARE;
  const long = half / Math.tan(CENTRE_HALF_ANGLE);
  return {
    kind: 'hint',
    points: [onWork(x, 0), onWork(x + side * long, -half), onWork(x + side * long, half)],
  };
}
