import { entry, rackWheel } from '@/__tests__/support/wheel-page';
import { labelAt, lifeBar, lifeMarks, lossesOf } from '@/features/wheels/life-geometry';

const received = entry(1, { kind: 'received', diameterMm: 32 });
const dressed = entry(2, { kind: 'dressed', depthMm: 0.02, passes: 5 });
const used = entry(3, { kind: 'used', minutes: null, diameterMm: 31.5 });
const mounted = entry(4, { kind: 'mounted', grinderId: null, quillId: null });
const again = entry(5, { kind: 'dressed', depthMm: 0.01, passes: 2 });

const sizes = (entries: Parameters<typeof lifeMarks>[0], now: number) =>
  lifeMarks(entries, now).map(({ diameterMm }) => Number(diameterMm.toFixed(6)));

describe('the sizes of a wheel, one after another', () => {
  it('lose twice the depth of each pass, and take over what was measured', () => {
    // 32 - 2 x 5 x 0.02 = 31.8; measured 31.5; 31.5 - 2 x 2 x 0.01 = 31.46.
    expect(sizes([again, mounted, used, dressed, received], 31.46)).toEqual([
      32, 31.8, 31.5, 31.46,
    ]);
  });

  it('count nothing that was taken back', () => {
    const takenBack = { ...dressed, correctedBy: again.id };
    expect(sizes([received, takenBack, again], 31.96)).toEqual([32, 31.96]);
  });

  it('are found backwards where the oldest entries are not known and none was measured', () => {
    expect(sizes([again, dressed], 30)).toEqual([30.04, 30]);
  });

  it('begin at the first that was measured where one was', () => {
    expect(sizes([again, used, dressed], 31.46)).toEqual([31.5, 31.46]);
  });
});

it('tells what dressing took from what use took', () => {
  const losses = lossesOf(32, lifeMarks([received, dressed, used, again], 31.46));
  expect(losses.map(({ byDressing }) => byDressing)).toEqual([true, false, true]);
  expect(losses.map(({ fromMm, toMm }) => Number((fromMm - toMm).toFixed(6)))).toEqual([
    0.2, 0.3, 0.04,
  ]);
  expect(
    lossesOf(
      32,
      lifeMarks([received, entry(2, { kind: 'inspected', look: 'sound', diameterMm: 32 })], 32),
    ),
  ).toEqual([]);
});

describe('the bar', () => {
  const { data } = rackWheel({ diameterNowMm: 27 });

  it('begins a little below the smallest usable diameter, and ends at the new one', () => {
    // 22 to 32 mm is usable: the bar begins 0.35 x 10 mm below, at 18.5, and 135 px stand for 13.5 mm.
    expect(lifeBar(data, [], 135)).toMatchObject({ end: 35, now: 85, fresh: 135, endMm: 22 });
  });

  it('never reaches into the hole, and ends there where no smallest diameter is known', () => {
    const low = { ...data, smallestUsableMm: 10.5 };
    expect(lifeBar(low, [], 220).end).toBeCloseTo((0.5 / 22) * 220, 9);
    const unknown = lifeBar({ ...data, smallestUsableMm: null }, [], 220);
    expect(unknown).toMatchObject({ end: 0, endIs: 'hole', endMm: 10, now: 170 });
  });

  it('shows each dressing, however little it took', () => {
    const bar = lifeBar(data, lifeMarks([received, again], 31.96), 135);
    expect(bar.dressed).toEqual([{ x: expect.closeTo(134.6, 6), width: 2 }]);
  });
});

it('keeps a label inside the drawing', () => {
  const room = { width: 300, wordWidth: 80 };
  expect(labelAt('now', 10, room)).toMatchObject({ x: 0, anchor: 'start' });
  expect(labelAt('now', 290, room)).toMatchObject({ x: 300, anchor: 'end' });
  expect(labelAt('now', 150, room)).toMatchObject({ x: 150, anchor: 'middle' });
});
