/** Runs every `@example call // result` of the rules and units, and looks their sources up. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import { planSetup } from '@/shared/rules';
import type { CutBasis } from '@/shared/rules/cut-stage';
import { SOURCES } from '@/shared/rules/sources';
import { surfaceOf } from '@/shared/rules/surface';

import { BORE_GRINDER, jawsInput, LATHE, QUILL, SMALL_WHEEL } from '../../support/plan-inputs';
import { caseOf, lifeOf, MOUNTED, RECEIVED, RECORD, TAKEN_OFF } from '../../support/wheel-lives';

const ROOT = join(__dirname, '../../../shared');
const FOLDERS = ['rules', 'rules/published', 'units'];

interface Example {
  file: string;
  call: string;
  result: string | undefined;
}

const files = FOLDERS.flatMap((folder) =>
  readdirSync(join(ROOT, folder))
    .filter((name) => name.endsWith('.ts'))
    .map((name) => ({ name: `${folder}/${name}`, path: join(ROOT, folder, name) })),
);

const planInput = jawsInput();
const plan = planSetup(planInput);
const basis: CutBasis = {
  input: planInput,
  surface: surfaceOf(planInput),
  stockMm: plan.stock.value,
  energy: 38,
  burnMm: null,
  wheelMPerS: plan.speed.wheelSpeed.value,
  workMPerMin: plan.work.workSpeed.value,
  latheRpm: plan.work.latheRpm.value,
  stiffness: plan.quill.stiffnessAtWheel,
  plungeMm: null,
};

const [received, mounted, takenOff] = lifeOf(
  [RECEIVED, { id: 'received', happenedOn: '2026-01-05' }],
  [MOUNTED, { id: 'mounted' }],
  [TAKEN_OFF, { id: 'taken-off' }],
);
const [justReceived] = lifeOf(RECEIVED);
const stepCase = caseOf(justReceived ? [justReceived] : []);
const rackWheel = { ...RECORD, ...stepCase.standing };

/** What an example may name: every export of the rules and units, and the machines of one good setup. */
const scope: Record<string, unknown> = Object.assign(
  { planInput, plan, basis },
  { lathe: LATHE, grinder: BORE_GRINDER, quill: QUILL, wheel: SMALL_WHEEL },
  { rules: DEFAULT_SHOP_RULES, rackWheel, stepCase, received, mounted, takenOff },
  ...files.map(({ path }) => jest.requireActual<Record<string, unknown>>(path)),
);

function examplesOf({ name, path }: { name: string; path: string }): Example[] {
  const lines = readFileSync(path, 'utf8').split('\n');
  return lines.flatMap((line) => {
    const [, text] = /@example (.*)$/.exec(line) ?? [];
    if (text === undefined) return [];
    const at = text.lastIndexOf(' // ');
    return [
      at < 0
        ? { file: name, call: text, result: undefined }
        : { file: name, call: text.slice(0, at), result: text.slice(at + 4) },
    ];
  });
}

/** Runs a line of JavaScript with the scope in reach. */
function run(code: string): unknown {
  return new Function(...Object.keys(scope), `return (${code});`)(...Object.values(scope));
}

const LEADING_NUMBER = /^-?\d+(?:\.(\d+))?/;

/** Numbers are as exact as they are written: "32.72 m/s" is met by 32.7249. */
function expectResult(actual: unknown, written: string): void {
  const [number, decimals = ''] = LEADING_NUMBER.exec(written) ?? [];
  if (number !== undefined) expect(actual).toBeCloseTo(Number(number), decimals.length);
  else expect(actual).toEqual(run(written));
}

const examples = files.flatMap(examplesOf);

describe('the examples in the docstrings', () => {
  it.each(examples.map((example) => [example.file, example.call, example]))(
    '%s: %s',
    (_file, call, { result }) => {
      if (result === undefined) throw new Error('an example ends in // and its result');
      expectResult(run(call), result);
    },
  );

  it('are many', () => {
    expect(examples.length).toBeGreaterThan(80);
  });
});

describe('the sources in the docstrings', () => {
  const cited = files.flatMap(({ name, path }) =>
    [...readFileSync(path, 'utf8').matchAll(/@source (?!none: )(\S+)/g)].map(([, id = '']) => [
      name,
      id,
    ]),
  );

  it.each(cited)('%s names %s, which is in the registry', (_file, id) => {
    expect(Object.keys(SOURCES)).toContain(id);
  });
});
