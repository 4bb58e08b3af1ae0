import type { Material } from '../../domain/materials';
import { convertUnit } from '../../units/entry-units';
import { workRow, type WorkRow } from '../work-table';
import { casesOf } from './case';
import type { NumberCheck } from './types';

interface Row {
  work: string;
  material: Material;
  feetPerMin: number;
  /** The metric figure beside it, and half of its last place. */
  metresPerMin: readonly [printed: number, within: number];
  finishInches: readonly number[];
  shares: readonly [rough: string, finish: string];
}

const TABLE: readonly Row[] = [
  {
    work: 'plain carbon steel, annealed',
    material: 'plain-carbon-annealed',
    feetPerMin: 100,
    metresPerMin: [30.5, 0.05],
    finishInches: [0.0005],
    shares: ['1/2', '1/6'],
  },
  {
    work: 'plain carbon steel, hardened',
    material: 'plain-carbon-hardened',
    feetPerMin: 70,
    metresPerMin: [21, 0.5],
    finishInches: [0.0003, 0.0005],
    shares: ['1/4', '1/8'],
  },
  {
    work: 'alloy steel, annealed',
    material: 'alloy-annealed',
    feetPerMin: 100,
    metresPerMin: [30.5, 0.05],
    finishInches: [0.0005],
    shares: ['1/2', '1/6'],
  },
  {
    work: 'alloy steel, hardened',
    material: 'alloy-hardened',
    feetPerMin: 70,
    metresPerMin: [21, 0.5],
    finishInches: [0.0002, 0.0005],
    shares: ['1/4', '1/8'],
  },
  {
    work: 'tool steel, annealed',
    material: 'tool-annealed',
    feetPerMin: 60,
    metresPerMin: [18, 0.5],
    finishInches: [0.0005],
    shares: ['1/2', '1/6'],
  },
  {
    work: 'tool steel, hardened',
    material: 'tool-hardened',
    feetPerMin: 50,
    metresPerMin: [15, 0.5],
    finishInches: [0.0001, 0.0005],
    shares: ['1/4', '1/8'],
  },
  {
    work: 'copper alloys',
    material: 'copper-alloy',
    feetPerMin: 100,
    metresPerMin: [30.5, 0.05],
    finishInches: [0.0005],
    shares: ['1/3', '1/6'],
  },
  {
    work: 'aluminium alloys',
    material: 'aluminium-alloy',
    feetPerMin: 150,
    metresPerMin: [45.7, 0.05],
    finishInches: [0.0005],
    shares: ['1/3', '1/6'],
  },
];

const PLUNGE: readonly [work: string, Material, rough: number, finish: number][] = [
  ['soft steel', 'plain-carbon-annealed', 0.0005, 0.0002],
  ['plain carbon steel, hardened', 'plain-carbon-hardened', 0.0002, 0.00005],
  ['alloy steel, hardened', 'alloy-hardened', 0.0001, 0.000025],
  ['tool steel, hardened', 'tool-hardened', 0.0001, 0.000025],
];

const FRACTIONS: Record<string, number> = {
  '1/2': 1 / 2,
  '1/3': 1 / 3,
  '1/4': 1 / 4,
  '1/6': 1 / 6,
  '1/8': 1 / 8,
};

const inches = (mm: number) => convertUnit(mm, 'mm', 'in');

const depth = (inputs: string, checks: string, [expected, got]: [number, () => number]) =>
  ({ checks, inputs, expected, unit: 'in', tolerance: 'exact', got }) satisfies NumberCheck;

function traverse(inputs: string, stage: string, [printed, got]: [string, () => number]) {
  return {
    checks: `Traverse for each turn of the work as a share of the wheel’s width, ${stage}`,
    inputs,
    expected: FRACTIONS[printed] ?? NaN,
    printed,
    unit: 'of the width',
    tolerance: 'exact',
    got,
  } satisfies NumberCheck;
}

function rowChecks({ work, material, feetPerMin, metresPerMin, ...row }: Row): NumberCheck[] {
  const [least, most = least] = row.finishInches;
  const [rough, finish] = row.shares;
  const [metres, within] = metresPerMin;
  const ask = (pick: (rules: WorkRow) => number) => () => pick(workRow(material));
  return [
    {
      checks: 'Work speed',
      inputs: work,
      expected: feetPerMin,
      unit: 'ft/min',
      tolerance: 'exact',
      got: ask((rules) => convertUnit(rules.workSpeedMPerMin, 'm/min', 'ft/min')),
    },
    {
      checks: 'Work speed, metric column',
      inputs: `${work}, ${feetPerMin} ft/min`,
      expected: metres,
      unit: 'm/min',
      tolerance: { within },
      got: ask((rules) => rules.workSpeedMPerMin),
    },
    depth(work, 'Infeed for each pass, rough', [
      0.002,
      ask((rules) => inches(rules.roughInfeedMm)),
    ]),
    ...(row.finishInches.length > 1
      ? [
          depth(work, 'Infeed for each pass, finish, least', [
            least ?? NaN,
            ask((rules) => inches(rules.finishInfeedMm.low)),
          ]),
        ]
      : []),
    depth(work, 'Infeed for each pass, finish, most', [
      most ?? NaN,
      ask((rules) => inches(rules.finishInfeedMm.high)),
    ]),
    traverse(work, 'rough', [rough, ask((rules) => rules.roughTraverseShare)]),
    traverse(work, 'finish', [finish, ask((rules) => rules.finishTraverseShare)]),
  ];
}

export const machinerysHandbookWork = casesOf('mh31-1318', [
  ...TABLE.flatMap(rowChecks).map((check) => ({ ...check, at: 'table 3' })),
  ...PLUNGE.flatMap(([work, material, rough, finish]) => [
    depth(work, 'Plunge infeed for each turn of the work, rough', [
      rough,
      () => inches(workRow(material).plungeInfeedMm.rough),
    ]),
    depth(work, 'Plunge infeed for each turn of the work, finish', [
      finish,
      () => inches(workRow(material).plungeInfeedMm.finish),
    ]),
  ]),
]);

export const recalledMaterials = casesOf(
  'memory-materials',
  (['cast-iron', 'stainless'] as const).map((material) => ({
    checks: 'Work speed, as for plain carbon steel, annealed',
    inputs: material === 'cast-iron' ? 'cast iron' : 'stainless steel',
    expected: 100,
    unit: 'ft/min',
    tolerance: 'exact' as const,
    got: () => convertUnit(workRow(material).workSpeedMPerMin, 'm/min', 'ft/min'),
  })),
);
