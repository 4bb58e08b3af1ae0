import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import { balanceCut, infeedCaps, leastCap, withCap } from '@/shared/rules/infeed';
import { feedAtMost, overrun, travel, traverseAims } from '@/shared/rules/traverse';
import { workRow } from '@/shared/rules/work-table';
import { planSetup } from '@/shared/rules';

import { boreInput, jawsInput, LATHE, outsideInput, QUILL } from '../../support/plan-inputs';

describe('overrun and travel', () => {
  it('are a third of the wheel, and the surface less a third of the wheel', () => {
    const past = overrun(12, null);
    expect(past.value).toBeCloseTo(4, 12);
    expect(travel(30, 12, past).value).toBeCloseTo(26, 12);
  });

  it('keep the wheel on the surface: it never stands off both its ends', () => {
    for (const length of [13, 30, 150]) {
      const stroke = travel(length, 12, overrun(12, null)).value ?? NaN;
      const leadingEdgeAtEnd = -4 + 12 + stroke;
      expect(leadingEdgeAtEnd - length).toBeCloseTo(4, 9);
    }
  });
});

describe('the traverse aimed at', () => {
  const shares = { rough: 1 / 8, finish: 1 / 16 };

  it("is the shop's for a tool-post grinder where the table allows more", () => {
    const aims = traverseAims(16, 'alloy-hardened', shares);
    expect(aims.rough.value).toBeCloseTo(2, 12);
    expect(aims.finish.value).toBeCloseTo(1, 12);
    expect(aims.rough.working.source).toBe('memory-traverse-share');
  });

  it('is the table’s where a shop allows itself more', () => {
    const aims = traverseAims(16, 'alloy-hardened', { rough: 0.5, finish: 0.5 });
    expect(aims.rough.value).toBeCloseTo(4, 12);
    expect(aims.rough.working.source).toBe('mh31-1318');
  });

  it('takes the largest feed that is not above it, or goes by hand', () => {
    expect(feedAtMost([0.1, 0.4, 0.2], 0.3)).toEqual({ mmPerRev: 0.2, byHand: false });
    expect(feedAtMost([0.1, 0.3], 0.1 + 0.2)).toEqual({ mmPerRev: 0.3, byHand: false });
    expect(feedAtMost([0.5], 0.3)).toEqual({ mmPerRev: 0.3, byHand: true });
    expect(feedAtMost([], 0.3)).toEqual({ mmPerRev: 0.3, byHand: true });
  });
});

describe('caps on the rough infeed', () => {
  const row = workRow('alloy-hardened');
  const caps = (over: object) =>
    infeedCaps(row, {
      roughStockMm: 1,
      interrupted: false,
      rules: DEFAULT_SHOP_RULES,
      burnMm: null,
      stepMm: 0.005,
      ...over,
    });

  it('name the one that governs', () => {
    expect(leastCap(caps({}))).toEqual({ by: 'shop', valueMm: 0.0125 });
    expect(leastCap(caps({ roughStockMm: 0.03 }))).toMatchObject({ by: 'stock' });
    expect(leastCap(caps({ burnMm: 0.009 }))).toMatchObject({ by: 'burn' });
    expect(leastCap(caps({ interrupted: true }))).toEqual({ by: 'table', valueMm: 0.0075 });
    expect(leastCap([])).toBeNull();
  });

  it('keep the lower of two of a kind', () => {
    const two = [
      { by: 'table' as const, valueMm: 0.0127 },
      { by: 'shop' as const, valueMm: 0.005 },
    ];
    expect(withCap(two, { by: 'shop', valueMm: 0.0025 })).toContainEqual({
      by: 'shop',
      valueMm: 0.0025,
    });
    expect(withCap(two, { by: 'shop', valueMm: 0.02 })).toContainEqual({
      by: 'shop',
      valueMm: 0.005,
    });
    expect(withCap(two, { by: 'lag', valueMm: 0.003 })).toHaveLength(3);
  });

  it('do not ask for a finer dial because little is left to rough', () => {
    expect(leastCap(caps({ roughStockMm: 0.006 }))?.valueMm).toBe(0.005);
    expect(caps({ roughStockMm: 1e-17 }).map(({ by }) => by)).not.toContain('stock');
  });
});

describe('infeed against traverse', () => {
  const free = { lagPerMm2: null, wattsPerMm2: null, availableWatts: null, burnMm: null };
  const cap = { by: 'shop' as const, valueMm: 0.01 };
  const traverse = { aimMm: 1.6, leastMm: 0.8, fixed: false };
  const balance = (over: object, at: object = {}) =>
    balanceCut(cap, { ...traverse, ...at }, { ...free, lagLimitMm: 0.01, ...over });

  it('leaves both alone where nothing is too much', () => {
    expect(balance({ lagPerMm2: 0.5 })).toEqual({ infeedMm: 0.01, traverseMm: 1.6, by: 'shop' });
  });

  it('cuts the traverse first', () => {
    expect(balance({ lagPerMm2: 0.8 })).toMatchObject({ infeedMm: 0.01, by: 'shop' });
    expect(balance({ lagPerMm2: 0.8 }).traverseMm).toBeCloseTo(1.25, 12);
  });

  it('then the infeed, and names lag or power', () => {
    const bent = balance({ lagPerMm2: 2 });
    expect(bent).toMatchObject({ traverseMm: 0.8, by: 'lag' });
    expect(bent.infeedMm).toBeCloseTo(0.00625, 12);
    const weak = balance({ wattsPerMm2: 20_000, availableWatts: 100 });
    expect(weak).toMatchObject({ traverseMm: 0.8, by: 'power' });
    expect(weak.infeedMm).toBeCloseTo(0.00625, 12);
  });

  it('keeps a traverse that was chosen', () => {
    const kept = balance({ lagPerMm2: 0.8 }, { fixed: true });
    expect(kept).toMatchObject({ traverseMm: 1.6, by: 'lag' });
    expect(kept.infeedMm).toBeCloseTo(0.0078125, 12);
  });
});

describe('traverse and overrun in a plan', () => {
  const codes = (cut: object, make = boreInput) => {
    const input = make();
    return planSetup({ ...input, cut: { ...input.cut, ...cut } }).findings.map(({ code }) => code);
  };

  it('notes an overrun that opens or tightens the ends', () => {
    expect(codes({ overrunMm: 6 })).toEqual([]);
    expect(codes({ overrunMm: 6.1 })).toEqual(['overrun-bell-mouths']);
    expect(codes({ overrunMm: 3 })).toEqual([]);
    expect(codes({ overrunMm: 2.9 })).toEqual(['overrun-leaves-tight']);
    expect(codes({ overrunMm: 9 }, outsideInput)).toEqual([]);
  });

  it('notes a traverse above the usual, and checks one over the width', () => {
    expect(codes({ finishTraverseMmPerRev: 0.9 })).toEqual(['traverse-above-usual']);
    expect(codes({ roughTraverseMmPerRev: 12.1, roughInfeedMm: 0.0025 })).toContain(
      'traverse-over-width',
    );
  });

  it('goes by hand where the lathe has no feed so fine, with the seconds to count', () => {
    const input = boreInput();
    const plan = planSetup({ ...input, lathe: { ...LATHE, feedsMmPerRev: [] } });
    const note = plan.findings.find(({ code }) => code === 'hand-traverse');
    const travelMm = plan.traverse.travel.value ?? NaN;
    const perSecond = ((plan.traverse.rough.value ?? NaN) * (plan.work.latheRpm.value ?? NaN)) / 60;
    expect(note?.figures.seconds?.value).toBeCloseTo(travelMm / perSecond, 9);
    expect(plan.verdict).toBe('clear');
  });
});

describe('a slender quill in jaws', () => {
  const base = jawsInput();
  const plan = planSetup({
    ...base,
    quill: { ...QUILL, segments: [{ lengthMm: 90, diameterMm: 10 }] },
  });

  it('is judged at the feed that is there: the largest infeed that keeps the lag', () => {
    const halfDivision = 0.0025;
    const lagMm = plan.quill.lag.value ?? NaN;
    const infeedMm = plan.infeed.rough.value ?? NaN;
    expect(plan.infeed.governedBy).toBe('lag');
    expect(lagMm).toBeLessThanOrEqual(0.015);
    expect((lagMm * (infeedMm + halfDivision)) / infeedMm).toBeGreaterThan(0.015);
  });

  it('finishes with no more than it roughs', () => {
    expect(plan.infeed.finish.value).toBeLessThanOrEqual(plan.infeed.rough.value ?? NaN);
  });
});

describe('time', () => {
  it('is passes times travel over rate, twice for both strokes, and dressing', () => {
    const input = boreInput();
    const both = planSetup(input);
    const one = planSetup({ ...input, cut: { ...input.cut, strokes: 'one stroke' } });
    expect(both.time.grinding.value).toBeCloseTo(2 * (one.time.grinding.value ?? NaN), 9);
    const minutes = one.passes.reduce((sum, { stage }) => {
      const rate = stage.startsWith('rough') ? one.traverse.roughRate : one.traverse.finishRate;
      return sum + (one.traverse.travel.value ?? NaN) / (rate.value ?? NaN);
    }, 0);
    expect(one.time.grinding.value).toBeCloseTo(minutes, 9);
    expect(one.time.total.value).toBeCloseTo(minutes + (one.time.dressing.value ?? NaN), 9);
  });
});
