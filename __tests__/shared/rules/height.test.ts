import fc from 'fast-check';

import { groundRadius, infeedGain, shimStack, type Shim } from '@/shared/rules/height';

describe('a wheel off centre height', () => {
  it('grinds larger outside and larger inside', () => {
    const on = { acrossMm: 60, heightMm: 0, wheelRadiusMm: 40 };
    const off = { ...on, heightMm: 5 };
    expect(groundRadius(on, 'outside').value).toBe(20);
    expect(groundRadius(off, 'outside').value).toBeGreaterThan(20);
    expect(groundRadius({ ...on, acrossMm: 10 }, 'inside').value).toBe(50);
    expect(groundRadius({ ...off, acrossMm: 10 }, 'inside').value).toBeGreaterThan(50);
  });

  it('does the same above and below', () => {
    const at = (heightMm: number) =>
      groundRadius({ acrossMm: 60, heightMm, wheelRadiusMm: 40 }, 'outside').value;
    expect(at(3)).toBe(at(-3));
  });

  it('grinds nothing past the axis', () => {
    expect(
      groundRadius({ acrossMm: 40, heightMm: 0, wheelRadiusMm: 40 }, 'outside').value,
    ).toBeNull();
  });

  it('feeds as the ground radius changes with the slide', () => {
    const height = fc.double({ min: -20, max: 20, noNaN: true });
    fc.assert(
      fc.property(height, (heightMm) => {
        const at = (acrossMm: number) =>
          groundRadius({ acrossMm, heightMm, wheelRadiusMm: 30 }, 'outside').value ?? NaN;
        const change = (at(60.0001) - at(59.9999)) / 0.0002;
        return Math.abs(change - (infeedGain(60, heightMm).value ?? NaN)) < 1e-6;
      }),
    );
  });

  it('has no gain on the axis itself', () => {
    expect(infeedGain(0, 0).value).toBeNull();
  });
});

describe('a stack of shims', () => {
  const shop: Shim[] = [
    { thicknessMm: 0.05, count: 3 },
    { thicknessMm: 1, count: 2 },
    { thicknessMm: 0.5, count: 1 },
    { thicknessMm: 0.2, count: 2 },
    { thicknessMm: 0.1, count: 1 },
  ];

  it('takes the fewest pieces, thickest first', () => {
    expect(shimStack(1.7, 0.001, shop)?.piecesMm).toEqual([1, 0.5, 0.2]);
    expect(shimStack(0.15, 0.001, shop)?.piecesMm).toEqual([0.1, 0.05]);
  });

  it('takes fewer pieces before a nearer height, and the nearer of as many', () => {
    expect(shimStack(1.04, 0.05, shop)).toEqual({ piecesMm: [1], heightMm: 1 });
    expect(shimStack(0.16, 0.05, shop)?.piecesMm).toEqual([0.2]);
  });

  it('needs nothing within the tolerance of nothing', () => {
    expect(shimStack(0.01, 0.02, shop)).toEqual({ piecesMm: [], heightMm: 0 });
  });

  it('is not there when no few pieces make it', () => {
    expect(shimStack(0.03, 0.001, shop)).toBeNull();
    expect(shimStack(30, 0.001, shop)).toBeNull();
    expect(shimStack(-1, 0.001, shop)).toBeNull();
    expect(shimStack(1, 0.001, [])).toBeNull();
    expect(shimStack(1, 0.001, [{ thicknessMm: 0, count: 9 }])).toBeNull();
  });

  it('does not take more of one than there are, and does not touch the list', () => {
    const before = structuredClone(shop);
    expect(shimStack(3, 0.001, shop)?.piecesMm).toEqual([1, 1, 0.5, 0.2, 0.2, 0.1]);
    expect(shimStack(3.15, 0.001, shop)).toBeNull();
    expect(shop).toEqual(before);
  });

  it('agrees with trying every combination', () => {
    const anyShims = fc.array(
      fc.record({
        thicknessMm: fc.integer({ min: 1, max: 40 }).map((n) => n / 20),
        count: fc.integer({ min: 0, max: 2 }),
      }),
      { minLength: 1, maxLength: 4 },
    );
    fc.assert(
      fc.property(anyShims, fc.integer({ min: 1, max: 100 }), (shims, height) => {
        const wanted = height / 20;
        let sums = [{ sum: 0, pieces: 0 }];
        for (const { thicknessMm, count } of shims)
          for (let i = 0; i < count; i += 1)
            sums = sums.flatMap((s) => [s, { sum: s.sum + thicknessMm, pieces: s.pieces + 1 }]);
        const fitting = sums.filter(
          ({ sum, pieces }) => pieces > 0 && pieces <= 6 && Math.abs(sum - wanted) <= 0.02 + 1e-9,
        );
        const fewest = Math.min(...fitting.map(({ pieces }) => pieces));
        const stack = shimStack(wanted, 0.02, shims);
        return stack === null ? fitting.length === 0 : stack.piecesMm.length === fewest;
      }),
      { numRuns: 500 },
    );
  });
});
