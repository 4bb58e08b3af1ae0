import { performance } from 'node:perf_hooks';

import { planSetup } from '@/shared/rules';

import { GOOD_INPUTS } from '../support/plan-inputs';

const WARM_UP_ROUNDS = 300;
const ROUNDS = 2_000;
const ARITHMETIC_STEPS = 10_000;

/** The yardstick: what this machine, as busy as it is, takes for plain numbers. */
function arithmetic(): number {
  let sum = 0;
  for (let step = 1; step <= ARITHMETIC_STEPS; step += 1) sum += Math.sqrt(step) / (step + 0.5);
  return sum;
}

function timed(work: () => unknown): number {
  const started = performance.now();
  work();
  return performance.now() - started;
}

const operations = Object.entries(GOOD_INPUTS).map(([name, make]) => ({ name, input: make() }));
const measured = new Map<string, number[]>(operations.map(({ name }) => [name, []]));
const yardstick: number[] = [];

// Interleaved, so that whatever else the machine does in the meantime falls on all of them alike.
for (let round = -WARM_UP_ROUNDS; round < ROUNDS; round += 1) {
  const plain = timed(arithmetic);
  if (round >= 0) yardstick.push(plain);
  for (const { name, input } of operations) {
    const spent = timed(() => planSetup(input));
    if (round >= 0) measured.get(name)?.push(spent);
  }
}

function quantile(times: readonly number[], share: number): number {
  const sorted = [...times].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? NaN;
}

const unit = quantile(yardstick, 0.5);
const row = (name: string, times: readonly number[]) => {
  const [median, p99] = [quantile(times, 0.5), quantile(times, 0.99)];
  return {
    of: name,
    'median, ms': median.toFixed(3),
    'p99, ms': p99.toFixed(3),
    'median / arithmetic': (median / unit).toFixed(2),
    'p99 / arithmetic': (p99 / unit).toFixed(2),
  };
};

process.stdout.write(`${ROUNDS} interleaved rounds; arithmetic is ${ARITHMETIC_STEPS} steps\n`);
console.table([
  row('arithmetic', yardstick),
  ...operations.map(({ name }) => row(name, measured.get(name) ?? [])),
]);
