import { render, screen, within } from '@testing-library/react';
import fc from 'fast-check';

import { anyPlanInput } from '@/__tests__/support/plan-arbitraries';
import {
  boreInput,
  GOOD_INPUTS,
  jawsInput,
  outsideInput,
  taperInput,
  withWork,
} from '@/__tests__/support/plan-inputs';
import { setupLayout } from '@/features/setups/components/pictures/setup-layout';
import {
  setupScene,
  type SetupScene,
  type ShapeKind,
} from '@/features/setups/components/pictures/setup-scene';
import { SetupToScale } from '@/features/setups/components/pictures/setup-to-scale';
import { dimensionWords } from '@/features/setups/components/pictures/setup-words';
import { wordsWidth } from '@/features/ui/picture';
import type { Point } from '@/features/ui/polar';
import { OPERATIONS, type PlanInput } from '@/shared/domain/setups';
import { planSetup } from '@/shared/rules';

function scene(input: PlanInput): SetupScene {
  const found = setupScene(input, planSetup(input));
  if (!found) throw new Error('nothing to draw');
  return found;
}

const shape = (drawn: SetupScene, kind: ShapeKind): Point[] =>
  drawn.shapes.find((one) => one.kind === kind)?.points ?? [];
const span = (points: readonly Point[], axis: 'x' | 'y'): [number, number] => {
  const values = points.map((point) => point[axis]);
  return [Math.min(...values), Math.max(...values)];
};
const sides = (points: readonly Point[]) =>
  points.map((point, index) => {
    const next = points[(index + 1) % points.length] ?? point;
    return Math.hypot(next.x - point.x, next.y - point.y);
  });
const named = (drawn: SetupScene, name: string) =>
  drawn.dimensions.filter((dimension) => dimension.name === name);

describe('the set-up seen from above, in millimetres', () => {
  it('sets the wheel against a shaft on the operator’s side, an overrun before its end', () => {
    const drawn = scene(outsideInput());
    const [left, right] = span(shape(drawn, 'wheel'), 'x');
    // A 16 mm wheel runs over by a third of its width, on a shaft of 40 mm, 110 mm long.
    expect(left).toBeCloseTo(-16 / 3, 9);
    expect(right - left).toBeCloseTo(16, 9);
    expect(span(shape(drawn, 'wheel'), 'y')).toEqual([20, 140]);
    expect(span(shape(drawn, 'wheel at the other end'), 'x')[1]).toBeCloseTo(110 + 16 / 3, 9);
    expect(named(drawn, 'overrun').map(({ mm }) => mm)).toEqual([
      expect.closeTo(16 / 3, 9),
      expect.closeTo(16 / 3, 9),
    ]);
  });

  it('draws the shaft midway between its centres, at its own length and diameter', () => {
    const drawn = scene(outsideInput());
    expect(span(shape(drawn, 'work'), 'x')).toEqual([-20, 130]);
    expect(span(shape(drawn, 'work'), 'y')).toEqual([-20, 20]);
    expect(named(drawn, 'between centres')[0]?.mm).toBe(150);
  });

  it('measures the free length of a chucked shaft from the chuck to the far end', () => {
    const drawn = scene(withWork(outsideInput(), { holding: 'chuck' }));
    expect(span(shape(drawn, 'work'), 'x')).toEqual([-40, 110]);
    expect(named(drawn, 'free length')[0]).toMatchObject({ mm: 150, from: -40, to: 110 });
  });

  it('sets the wheel inside a bore and the quill behind it, all the overhang long', () => {
    const drawn = scene(boreInput());
    const [top, bottom] = span(shape(drawn, 'wheel'), 'y');
    expect(bottom).toBeCloseTo(20, 9);
    expect(bottom - top).toBeCloseTo(27, 9);
    const quill = shape(drawn, 'quill');
    expect(span(quill, 'x')).toEqual([expect.closeTo(-4, 9), expect.closeTo(56, 9)]);
    const [quillTop, quillBottom] = span(quill, 'y');
    expect(quillBottom - quillTop).toBeCloseTo(16, 9);
    expect((quillTop + quillBottom) / 2).toBeCloseTo((top + bottom) / 2, 9);
    expect(named(drawn, 'overhang')[0]?.mm).toBeCloseTo(60, 9);
  });

  it('shows the free depth behind jaws, and none behind a through bore', () => {
    expect(named(scene(jawsInput()), 'free depth')[0]).toMatchObject({ mm: 20, from: -20, to: 0 });
    expect(named(scene(boreInput()), 'free depth')).toEqual([]);
  });

  it('lays the wheel along the cone that the compound travels, 30 degrees from the bed', () => {
    const drawn = scene(taperInput());
    const [from, to] = drawn.ground;
    const slope = (Math.atan2(from.y - to.y, to.x - from.x) * 180) / Math.PI;
    expect(slope).toBeCloseTo(30, 9);
    expect(drawn.compound?.angleDeg).toBeCloseTo(30, 9);
    const [start, end] = drawn.compound?.travel ?? [from, to];
    // Slant of 20 mm at 30 degrees, and a third of a 16 mm wheel past each end.
    expect(Math.hypot(end.x - start.x, end.y - start.y)).toBeCloseTo(
      20 / Math.cos(Math.PI / 6) + 32 / 3,
      9,
    );
    const [length = 0, height = 0] = sides(shape(drawn, 'wheel'));
    expect(length).toBeCloseTo(16, 9);
    expect(height).toBeCloseTo(120, 9);
  });

  it('turns the work instead where the tailstock is set over: the ground side lies along the bed', () => {
    const input = withWork(taperInput(), {
      taperMethod: 'tailstock',
      holding: 'centres',
      includedAngleDeg: 3,
      lengthMm: 60,
      unsupportedLengthMm: 120,
    });
    const drawn = scene(input);
    const [from, to] = drawn.ground;
    expect(to.y).toBeCloseTo(from.y, 9);
    expect(drawn.compound).toBeNull();
    const [head, tail] = drawn.axis;
    expect((Math.atan2(tail.y - head.y, tail.x - head.x) * 180) / Math.PI).toBeCloseTo(1.5, 9);
  });

  it('leaves out the overrun at a shoulder', () => {
    const drawn = scene(withWork(outsideInput(), { shoulders: 'one end' }));
    expect(named(drawn, 'overrun')).toHaveLength(1);
    expect(span(shape(drawn, 'wheel'), 'x')[0]).toBeCloseTo(0, 9);
  });

  it('points the arrows where the tops go: clockwise from the tailstock is away from the operator', () => {
    const way = ([from, to]: [Point, Point]) => Math.sign(to.y - from.y);
    const { workArrow, wheelArrow } = scene(boreInput());
    // The wheel turns clockwise, and work ground inside the other way.
    expect(wheelArrow && way(wheelArrow)).toBe(-1);
    expect(workArrow && way(workArrow)).toBe(1);
    expect(scene({ ...boreInput(), grinder: null }).wheelArrow).toBeNull();
  });

  it('draws nothing before length and diameter are known', () => {
    const input = withWork(outsideInput(), { diameterMm: null });
    expect(setupScene(input, planSetup(input))).toBeNull();
  });
});

describe('whatever is typed', () => {
  it('is drawn at finite places, or not at all', () => {
    fc.assert(
      fc.property(anyPlanInput, (input) => {
        const drawn = setupScene(input, planSetup(input));
        if (drawn === null) return;
        const { left, right, top, bottom } = drawn.bounds;
        const places = drawn.shapes.flatMap(({ points }) => points.flatMap(({ x, y }) => [x, y]));
        for (const place of [left, right, top, bottom, ...places])
          expect(Number.isFinite(place)).toBe(true);
        expect(right).toBeGreaterThan(left);
        expect(bottom).toBeGreaterThan(top);
      }),
      { numRuns: 500 },
    );
  });
});

describe('the drawing on its place', () => {
  const sizes = fc.record({
    operation: fc.constantFrom(...OPERATIONS),
    diameterMm: fc.double({ min: 5, max: 400, noNaN: true }),
    lengthMm: fc.double({ min: 2, max: 900, noNaN: true }),
    width: fc.integer({ min: 260, max: 560 }),
    textScale: fc.constantFrom(1, 1.5, 2),
  });

  it('is one scale both ways, keeps inside its width, and keeps its words apart', () => {
    fc.assert(
      fc.property(sizes, ({ operation, diameterMm, lengthMm, width, textScale }) => {
        const input = withWork(GOOD_INPUTS[operation](), {
          diameterMm,
          jawBoreMm: diameterMm,
          lengthMm,
          includedAngleDeg: 4,
        });
        const drawn = setupScene(input, planSetup(input));
        if (!drawn) return;
        const words = (dimension: SetupScene['dimensions'][number]) =>
          dimensionWords(dimension, 'mm');
        const layout = setupLayout(drawn, { width, textScale }, words);
        const points = drawn.shapes.flatMap((one) => one.points);
        for (const point of points.map(layout.place)) {
          expect(point.x).toBeGreaterThanOrEqual(-1e-6);
          expect(point.x).toBeLessThanOrEqual(width + 1e-6);
          expect(point.y).toBeLessThanOrEqual(layout.foot + 1e-6);
        }
        const [one, other] = [layout.place({ x: 0, y: 0 }), layout.place({ x: 10, y: 10 })];
        expect(other.x - one.x).toBeCloseTo(other.y - one.y, 6);
        const taken = layout.marks.map(({ words: said, from, to, wordsAt, y }) => {
          const half = wordsWidth(said, 'small', textScale) / 2;
          return { y, start: Math.min(from, wordsAt - half), end: Math.max(to, wordsAt + half) };
        });
        for (const mark of taken) {
          expect(mark.y).toBeLessThan(layout.height);
          const beside = taken.filter((next) => next !== mark && next.y === mark.y);
          for (const next of beside)
            expect(next.start >= mark.end || next.end <= mark.start).toBe(true);
        }
      }),
      { numRuns: 150 },
    );
  });
});

describe('the picture in words', () => {
  const sentences = (input: PlanInput, units: 'mm' | 'inch' = 'mm') => {
    render(<SetupToScale input={input} plan={planSetup(input)} units={units} />);
    return within(screen.getByRole('list', { name: 'The set-up in words' }))
      .getAllByRole('listitem')
      .map((item) => item.textContent?.replaceAll('\u00a0', ' '));
  };

  it('says what stands where', () => {
    const said = sentences(jawsInput());
    expect(said).toContain('Jaws closed on 40 mm, 32 mm to grind, free depth 20 mm.');
    expect(said).toContain('The wheel runs 4 mm past each end.');
    expect(said).toContain('One stroke is 28 mm long.');
    expect(said.join(' ')).toMatch(/reaches 60 mm from its bearing to the front of the wheel/);
    expect(said.join(' ')).toMatch(/wheel clockwise, work anticlockwise, seen from the tailstock/);
  });

  it('gives the compound’s angle and travel', () => {
    expect(sentences(taperInput()).join(' ')).toMatch(
      /The compound travels at 30° to the spindle axis, 33.76 mm with the overrun of 5.33 mm/,
    );
  });

  it('reads in inches', () => {
    expect(sentences(outsideInput(), 'inch').join(' ')).toMatch(
      /Work of 1.575 in, 4.331 in to grind/,
    );
  });

  it('waits for the work', () => {
    const input = withWork(jawsInput(), { jawBoreMm: null });
    render(<SetupToScale input={input} plan={planSetup(input)} units="mm" />);
    expect(screen.getByText(/^Drawn as soon as diameter and length/)).toBeInTheDocument();
  });
});
