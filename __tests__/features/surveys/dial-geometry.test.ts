import fc from 'fast-check';

import { dialLayout, dialMarks } from '@/features/surveys/dial-geometry';
import { fitRunout } from '@/shared/rules/runout';

const layout = dialLayout(320, 1);
const { centre } = layout;
const reach = ({ x, y }: { x: number; y: number }) => Math.hypot(x - centre.x, y - centre.y);

const anyReadings = fc
  .array(fc.double({ min: -0.5, max: 0.5, noNaN: true }), { minLength: 3, maxLength: 24 })
  .map((values) =>
    values.map((readingMm, index) => ({ angleDeg: (index * 360) / values.length, readingMm })),
  );

it('keeps every reading inside the dial, at its own angle, and larger ones further out', () => {
  fc.assert(
    fc.property(anyReadings, (readings) => {
      const { points } = dialMarks(readings, fitRunout(readings), layout);
      points.forEach((point, index) => {
        expect(reach(point)).toBeLessThanOrEqual(layout.radius);
        const angle = (Math.atan2(point.x - centre.x, centre.y - point.y) * 180) / Math.PI;
        const off = Math.abs(angle - (readings[index]?.angleDeg ?? 0)) % 360;
        expect(Math.min(off, 360 - off)).toBeLessThan(1e-6);
      });
      const order = (by: (index: number) => number) =>
        readings.map((_, index) => index).sort((a, b) => by(a) - by(b) || a - b);
      const reached = points.map((point) => Math.round(reach(point) * 1e6));
      const values = readings.map(({ readingMm }) => readingMm);
      for (const [index, next] of order((i) => values[i] ?? 0).entries()) {
        const before = order((i) => values[i] ?? 0)[index - 1];
        if (before === undefined) continue;
        expect(reached[next] ?? 0).toBeGreaterThanOrEqual((reached[before] ?? 0) - 1);
      }
    }),
    { numRuns: 60 },
  );
});

it('draws the circle through readings of a round part, its hand to the highest of them', () => {
  const readings = [0, 45, 90, 135, 180, 225, 270, 315].map((angleDeg) => ({
    angleDeg,
    readingMm: 0.05 * Math.cos(((angleDeg - 90) * Math.PI) / 180),
  }));
  const { points, hand } = dialMarks(readings, fitRunout(readings), layout);
  expect(hand?.x).toBeCloseTo(points[2]?.x ?? NaN, 6);
  expect(hand?.y).toBeCloseTo(points[2]?.y ?? NaN, 6);
});

it('stands all readings on one ring where nothing runs out', () => {
  const readings = [0, 120, 240].map((angleDeg) => ({ angleDeg, readingMm: 0.2 }));
  const { points, hand } = dialMarks(readings, fitRunout(readings), layout);
  for (const point of points) expect(reach(point)).toBeCloseTo(layout.baseRadius, 6);
  expect(hand).toBeNull();
});
