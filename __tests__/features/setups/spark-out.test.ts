import { changesOf, readSizes } from '@/features/setups/spark-out';

it('reads sizes in the order of the passes, in the unit of the person', () => {
  expect(readSizes('40,02\n40.012; 40.008', 'mm')).toEqual({
    sizesMm: [40.02, 40.012, 40.008],
    fault: null,
  });
  expect(readSizes('1.5', 'inch').sizesMm[0]).toBeCloseTo(38.1, 12);
});

it('says which size it cannot read', () => {
  expect(readSizes('40.02\nforty', 'mm').fault).toMatch(/^Size 2 is a number/);
});

it('counts what comes off: a shaft gets smaller, a bore larger', () => {
  const near = (values: number[]) => values.map((value) => expect.closeTo(value, 9));
  expect(changesOf([40.02, 40.012, 40.008], 'outside')).toEqual(near([0.008, 0.004]));
  expect(changesOf([40, 40.008, 40.012], 'inside')).toEqual(near([0.008, 0.004]));
  expect(changesOf([40], 'outside')).toEqual([]);
});
