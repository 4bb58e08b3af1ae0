import type { Rotation } from '@/shared/domain/machines';
import {
  requiredWorkRotation,
  rotationFindings,
  tighteningHand,
  workRotation,
  type Turning,
} from '@/shared/rules/rotation';

import { ARBOR, BORE_GRINDER, LATHE, QUILL, SHAFT_GRINDER } from '../../support/plan-inputs';

const BORING: Turning = {
  side: 'inside',
  lathe: LATHE,
  grinder: BORE_GRINDER,
  quill: QUILL,
  workRotation: null,
};
const SHAFT: Turning = { ...BORING, side: 'outside', grinder: SHAFT_GRINDER, quill: ARBOR };
const codes = (turning: Turning) => rotationFindings(turning).map(({ code }) => code);

/**
 * Velocity of a point on a rim, from first principles: seen from the tailstock x points right and y up, and
 * anticlockwise is positive. Both rims are taken at the point where they touch, on the x axis.
 */
function rimVelocity(rotation: Rotation, radius: number): number {
  return (rotation === 'anticlockwise' ? 1 : -1) * radius;
}

describe('the way the work must turn', () => {
  it.each(['clockwise', 'anticlockwise'] as const)(
    'makes the rims meet where they touch, wheel %s',
    (wheel) => {
      // Outside: the wheel's centre stands right of the work, so it is touched on its left side.
      const outside = requiredWorkRotation('outside', wheel);
      expect(Math.sign(rimVelocity(outside, 20)) * Math.sign(rimVelocity(wheel, -60))).toBe(-1);
      // Inside: the wheel stands right of the axis, and both are touched on their right side.
      const inside = requiredWorkRotation('inside', wheel);
      expect(Math.sign(rimVelocity(inside, 20)) * Math.sign(rimVelocity(wheel, 14))).toBe(-1);
    },
  );

  it('is the same way outside and the other way inside', () => {
    expect(workRotation(SHAFT).work).toBe('anticlockwise');
    expect(workRotation(BORING).work).toBe('anticlockwise');
    expect(workRotation({ ...BORING, grinder: SHAFT_GRINDER }).work).toBe('clockwise');
  });

  it('is unknown while the way of the wheel is', () => {
    const unknown = { ...BORE_GRINDER, wheelRotation: null };
    expect(workRotation({ ...BORING, grinder: unknown }).work).toBeNull();
  });
});

describe('the hand of thread that stays tight', () => {
  /** The right-hand end of a bench grinder turns anticlockwise seen from that end, on a right-hand thread. */
  it('agrees with a bench grinder, seen through the spindle', () => {
    // Its right end is seen by someone at the right; the tailstock stands behind the spindle, at its left.
    const seenFromBehind: Rotation = 'clockwise';
    expect(tighteningHand(seenFromBehind)).toBe('right');
    expect(tighteningHand('anticlockwise')).toBe('left');
  });
});

describe('findings about directions', () => {
  it('are none where everything is known and turns as it should', () => {
    expect(codes(BORING)).toEqual([]);
    expect(codes(SHAFT)).toEqual([]);
  });

  it('stop at anything nobody has looked at', () => {
    expect(codes({ ...BORING, grinder: { ...BORE_GRINDER, wheelRotation: null } })).toEqual([
      'wheel-rotation-unknown',
    ]);
    expect(codes({ ...BORING, lathe: { ...LATHE, spindleNose: null } })).toEqual(['nose-unknown']);
    expect(codes({ ...BORING, quill: { ...QUILL, threadHand: null } })).toEqual([
      'thread-hand-unknown',
    ]);
  });

  it('say nothing of machines that are not chosen', () => {
    expect(codes({ ...BORING, lathe: null, grinder: null, quill: null })).toEqual([]);
  });

  it('stop at a nut that works loose, and not at a gripped mandrel', () => {
    const left = { ...QUILL, threadHand: 'left' as const };
    expect(rotationFindings({ ...BORING, quill: left })).toMatchObject([
      { code: 'nut-loosens', level: 'stop', names: { hand: 'left', needed: 'right' } },
    ]);
    expect(codes({ ...BORING, quill: { ...QUILL, threadHand: 'none' } })).toEqual([]);
  });

  it('stop at work that turns backwards on a screwed nose, not on a locked one', () => {
    const reversed = {
      ...BORING,
      grinder: SHAFT_GRINDER,
      quill: { ...QUILL, threadHand: 'left' as const },
    };
    expect(codes(reversed)).toEqual([]);
    expect(codes({ ...reversed, lathe: { ...LATHE, spindleNose: 'threaded' } })).toEqual([
      'chuck-can-unscrew',
    ]);
    expect(codes({ ...BORING, lathe: { ...LATHE, spindleNose: 'threaded' } })).toEqual([]);
  });

  it('check work that runs along with the wheel', () => {
    expect(rotationFindings({ ...BORING, workRotation: 'clockwise' })).toMatchObject([
      { code: 'work-rotation-other', level: 'check', names: { needed: 'anticlockwise' } },
    ]);
  });
});
