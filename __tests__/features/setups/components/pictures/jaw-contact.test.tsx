import { render, screen, within } from '@testing-library/react';
import * as fc from 'fast-check';

import { jawsInput } from '@/__tests__/support/plan-inputs';
import { JawContactPicture } from '@/features/setups/components/pictures/jaw-contact';
import {
  chuckLayout,
  exaggeration,
  jawOutline,
} from '@/features/setups/components/pictures/jaw-geometry';
import { jawLabel } from '@/features/setups/components/pictures/jaw-words';
import type { Point } from '@/features/ui/polar';
import { planJaws } from '@/shared/rules/jaws';
import { planSetup, type JawPlan } from '@/shared/rules';

const BORE = 58;

function chuck(jaws: number, padWidthMm: number, offset: Point): JawPlan {
  const plan = planJaws({
    jawCount: jaws,
    boreMm: BORE,
    padWidthMm,
    padBackMm: 0,
    padFrontMm: 32,
    lastGroundMm: null,
    offset: { at0: { aMm: offset.x, bMm: offset.y }, perMm: { aMm: 0, bMm: 0 } },
    padErrors: [],
  });
  if (!plan) throw new Error('no plan');
  return plan;
}

const points = (path: string): Point[] =>
  [...path.matchAll(/(-?[\d.]+),(-?[\d.]+)/g)].map((match) => ({
    x: Number(match[1]),
    y: Number(match[2]),
  }));

describe('the drawing of jaws', () => {
  it('sets the first jaw on the wheel’s path and the others off it by their gap', () => {
    const offset = fc.record({
      x: fc.double({ min: -0.2, max: 0.2, noNaN: true }),
      y: fc.double({ min: -0.2, max: 0.2, noNaN: true }),
    });
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 8 }), offset, (jaws, at) => {
        const plan = chuck(jaws, 8, at);
        const layout = chuckLayout(340, plan, 1);
        const times = exaggeration([plan], BORE);
        const pixels = (layout.pathRadius / (BORE / 2)) * times;
        for (const contact of plan.contacts) {
          const outline = jawOutline({ plan, contact, layout, times, boreMm: BORE, padWidthMm: 8 });
          const reach = points(outline).map(({ x, y }) =>
            Math.hypot(x - layout.centre.x, y - layout.centre.y),
          );
          const expected = layout.pathRadius + contact.touchesAtMm * pixels;
          // Coordinates are written to a tenth of a pixel.
          expect(Math.abs(Math.min(...reach) - expected)).toBeLessThan(0.15);
        }
      }),
    );
  });

  it('draws the largest gap plainly and inside the jaws, whatever its size', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.002, max: 0.5, noNaN: true }), (eccentricity) => {
        const plan = chuck(3, 8, { x: eccentricity, y: 0 });
        const gap = Math.max(...plan.contacts.map((contact) => contact.touchesAtMm));
        const share = (gap * exaggeration([plan], BORE)) / (BORE / 2);
        expect(share).toBeGreaterThan(0.2);
        expect(share).toBeLessThanOrEqual(0.38);
      }),
    );
  });

  it('does not enlarge what is not there', () => {
    expect(exaggeration([chuck(3, 8, { x: 0, y: 0 })], BORE)).toBe(1);
  });
});

describe('jaw contact in words', () => {
  const jaws = planSetup(jawsInput()).jaws;
  if (!jaws) throw new Error('no plan of jaws');
  const shown = { plan: jaws, boreMm: 40, padWidthMm: 12 };

  it('lists the jaws in the order in which they touch', () => {
    render(<JawContactPicture {...shown} units="mm" />);
    const list = screen.getByRole('list', { name: 'Order of contact' });
    const lines = within(list)
      .getAllByRole('listitem')
      .map((item) => item.textContent ?? '');
    expect(lines).toHaveLength(3);
    expect(lines[0]).toMatch(/^Jaw 3 touches first; clean to the back at 0\.\d{3}.mm$/);
    expect(lines[1]).toMatch(/^Jaw 1 touches second, after 0\.\d{3}.mm of infeed/);
    expect(lines[2]).toMatch(/^Jaw 2 touches last, after 0\.\d{3}.mm of infeed/);
  });

  it('reads in inches to a tenth of a thousandth', () => {
    render(<JawContactPicture {...shown} units="inch" />);
    expect(screen.getByText(/Jaw 2 touches last, after 0\.\d{4}.in of infeed/)).toBeInTheDocument();
  });

  it('says how much too large the offset is drawn', () => {
    render(<JawContactPicture {...shown} units="mm" />);
    expect(screen.getByText(/^Offset drawn \d+ times too large$/)).toBeInTheDocument();
    expect(screen.getByText(/^The jaws sit 0\.\d{3}.mm off the axis, towards \d+°/)).toBeVisible();
  });

  it('shows before and after to one scale', () => {
    render(<JawContactPicture {...shown} after={chuck(3, 12, { x: 0.002, y: 0 })} units="mm" />);
    expect(screen.getByRole('heading', { name: 'Before' })).toBeInTheDocument();
    expect(screen.getByRole('heading', { name: 'After' })).toBeInTheDocument();
    const captions = screen.getAllByText(/times too large/).map((caption) => caption.textContent);
    expect(new Set(captions).size).toBe(1);
  });

  it('labels each jaw with its order and infeed', () => {
    const [first] = [...jaws.contacts].sort((one, other) => one.order - other.order);
    if (!first) throw new Error('no jaws');
    expect(jawLabel(first, 3, 'mm')).toBe(`${first.jaw} · first, 0`);
  });
});
