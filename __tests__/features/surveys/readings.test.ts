import { readReadings, seenFromOutside } from '@/features/surveys/readings';

const angles = (text: string, spread: Parameters<typeof readReadings>[2] = 'as typed') =>
  readReadings(text, 'mm', spread).readings.map(({ angleDeg }) => angleDeg);

it('spreads a plain list evenly over the turn, whatever stands between the readings', () => {
  expect(angles('0.01; 0,02\n0.03;\n\n 0.02')).toEqual([0, 90, 180, 270]);
  expect(readReadings('0.01; 0,02', 'mm', 'as typed').readings).toEqual([
    { angleDeg: 0, readingMm: 0.01 },
    { angleDeg: 180, readingMm: 0.02 },
  ]);
});

it('says where the next reading is taken when their number is settled before', () => {
  const typed = readReadings('0\n0.01\n0.02', 'mm', '8');
  expect(typed.readings.map(({ angleDeg }) => angleDeg)).toEqual([0, 45, 90]);
  expect(typed.nextDeg).toBe(135);
  expect(readReadings('1;2;3;4', 'mm', '4').nextDeg).toBeNull();
  expect(readReadings('1;2;3;4;5', 'mm', '4').faults).toEqual([
    '5 readings are more than the 4 of one turn.',
  ]);
});

it('takes an angle before each reading, in degrees and minutes too', () => {
  expect(readReadings("30: -0.02\n120°: .5\n12° 30': 2 thou", 'mm', 'as typed').readings).toEqual([
    { angleDeg: 30, readingMm: -0.02 },
    { angleDeg: 120, readingMm: 0.5 },
    { angleDeg: 12.5, readingMm: expect.closeTo(0.0508, 12) },
  ]);
});

it('reads a bare number in the unit of the person', () => {
  const [first] = readReadings('.001', 'inch', 'as typed').readings;
  expect(first?.readingMm).toBeCloseTo(0.0254, 12);
});

it.each([
  ['0.01\nabc', /^Reading 2 is a number/],
  ['0.01; 99', /^Reading 2 is from −50 to 50.mm/],
  ['30: 0.01; 0.02', /^Give every reading its angle/],
  ['x: 0.01', /^Angle 1 is a number/],
  [': 0.01', /^Reading 1 needs an angle and a number/],
  [Array(73).fill('0').join(';'), /^At most 72 readings/],
])('says what it cannot read in %j', (text, words) => {
  expect(readReadings(text, 'mm', 'as typed').faults[0]).toMatch(words);
});

it('turns readings taken inside a bore round, and leaves the others', () => {
  const readings = [{ angleDeg: 40, readingMm: 0.02 }];
  expect(seenFromOutside(readings, true)).toEqual([{ angleDeg: 40, readingMm: -0.02 }]);
  expect(seenFromOutside(readings, false)).toEqual(readings);
});
