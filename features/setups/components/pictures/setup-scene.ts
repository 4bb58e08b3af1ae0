import type { Rotation } from '@/shared/domain/machines';
import type { Point } from '@/features/ui/polar';
import type { Plan, PlanInput } from '@/shared/rules';
import { effectiveQuill } from '@/shared/rules/mandrel';
import { surfaceOf } from '@/shared/rules/surface';

import { insideWork, outsideWork, pathOf, type Path } from './setup-work';

/** What a shape is, and so how it is drawn; a hint stands for something whose size is not asked. */
export type ShapeKind = 'work' | 'section' | 'wheel' | 'wheel at the other end' | 'quill' | 'hint';

export interface Shape {
  kind: ShapeKind;
  points: Point[];
}

export interface Dimension {
  name: 'ground' | 'overrun' | 'overhang' | 'free depth' | 'free length' | 'between centres';
  mm: number;
  /** Along the bed, mm. */
  from: number;
  to: number;
}

/**
 * The set-up seen from above in millimetres: x along the bed to the tailstock, 0 where the ground surface begins at
 * the headstock; y from the spindle axis towards the operator, on whose side the wheel is drawn.
 */
export interface SetupScene {
  shapes: Shape[];
  /** The ground line on the wheel's side. */
  ground: [Point, Point];
  axis: [Point, Point];
  /** Travel of the compound along a cone, with a mark where the surface ends on each side; else null. */
  compound: { travel: [Point, Point]; ends: [Point, Point]; angleDeg: number } | null;
  dimensions: Dimension[];
  /** Where the tops of work and wheel turn to: from tail to head of an arrow; null while unknown. */
  workArrow: [Point, Point] | null;
  wheelArrow: [Point, Point] | null;
  bounds: { left: number; right: number; top: number; bottom: number };
}

const STUB_SHARE = 0.3;
const ARROW_SHARE = 0.07;

/** Everything that a plan knows of where things stand; null while the surface itself is not known. */
export function setupScene(input: PlanInput, plan: Plan): SetupScene | null {
  const surface = surfaceOf(input);
  const path = pathOf(input, surface, plan);
  if (path === null) return null;
  const work = surface.side === 'outside' ? outsideWork(input, path) : insideWork(input, path);
  const wheel = wheelShapes(input, path);
  const shapes = [...work.shapes, ...wheel.shapes];
  const compound = compoundOf(path, wheel.diameterMm);
  const points = [...shapes.flatMap(({ points: all }) => all), ...(compound?.travel ?? [])];
  const [left, right] = span(points.map(({ x }) => x));
  const arrowAt = left - (right - left) * ARROW_SHARE;
  const arrowHalf = path.largestMm * 0.3;
  const [top, bottom] = span([...points.map(({ y }) => y), -arrowHalf, arrowHalf]);
  return {
    shapes,
    ground: [path.at(0, 0), path.at(path.lengthMm, 0)],
    axis: path.axis(left, right),
    compound,
    dimensions: [...work.dimensions, ...wheel.dimensions],
    workArrow: turned(plan.work.rotation.work, [
      { x: arrowAt, y: -arrowHalf },
      { x: arrowAt, y: arrowHalf },
    ]),
    wheelArrow: wheel.face ? turned(input.grinder?.wheelRotation ?? null, wheel.face) : null,
    bounds: { left: arrowAt - (right - left) * ARROW_SHARE, right, top, bottom },
  };
}

/** Seen from the tailstock, what turns clockwise moves away from the operator on top. */
function turned(rotation: Rotation | null, ends: [Point, Point]): [Point, Point] | null {
  if (rotation === null) return null;
  const [far, near] = ends[0].y < ends[1].y ? ends : [ends[1], ends[0]];
  return rotation === 'clockwise' ? [near, far] : [far, near];
}

function wheelShapes(input: PlanInput, path: Path) {
  const { wheelData } = input;
  const quill = effectiveQuill(input.quill, wheelData);
  if (wheelData === null) return { shapes: [], dimensions: [], face: null, diameterMm: 0 };
  const { diameterNowMm: across, widthMm: width } = wheelData;
  const start = path.fromMm;
  const block = (from: number, to: number, half: number) =>
    path.box([from, to], [across / 2 - half, across / 2 + half]);
  const shapes: Shape[] = [];
  let reach = start;
  for (const { lengthMm, diameterMm } of quill?.segments ?? []) {
    shapes.push({ kind: 'quill', points: block(reach, reach + lengthMm, diameterMm / 2) });
    reach += lengthMm;
  }
  const overhang = reach - start;
  const thickest = Math.max(...(quill?.segments ?? []).map(({ diameterMm }) => diameterMm));
  if (overhang > 0)
    shapes.push({ kind: 'hint', points: block(reach, reach + overhang * STUB_SHARE, thickest) });
  if (path.toMm - width > start)
    shapes.push({
      kind: 'wheel at the other end',
      points: block(path.toMm - width, path.toMm, across / 2),
    });
  shapes.push({ kind: 'wheel', points: block(start, start + width, across / 2) });
  const dimensions: Dimension[] =
    path.tilted || overhang <= 0
      ? []
      : [{ name: 'overhang', mm: overhang, from: start, to: start + overhang }];
  const middle = start + width / 2;
  const face: [Point, Point] = [path.at(middle, across * 0.2), path.at(middle, across * 0.8)];
  return {
    shapes,
    dimensions,
    face,
    diameterMm: across,
  };
}

/** Behind the wheel, so that it lies over nothing. */
function compoundOf(path: Path, acrossMm: number): SetupScene['compound'] {
  if (!path.tilted || path.halfAngleDeg === null) return null;
  const behind = acrossMm + path.largestMm * 0.2;
  return {
    travel: [path.at(path.fromMm, behind), path.at(path.toMm, behind)],
    ends: [path.at(0, behind), path.at(path.lengthMm, behind)],
    angleDeg: path.halfAngleDeg,
  };
}

const span = (values: readonly number[]): [number, number] => [
  Math.min(...values),
  Math.max(...values),
];
