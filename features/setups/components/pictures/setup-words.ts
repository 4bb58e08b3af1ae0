import type { UnitSystem } from '@/shared/domain/people';
import type { Plan, PlanInput } from '@/shared/rules';
import { surfaceOf } from '@/shared/rules/surface';
import { formatQuantity } from '@/shared/units/format';

import type { Dimension, SetupScene } from './setup-scene';

const length = (value: number, units: UnitSystem, withUnit = true) =>
  formatQuantity({ value, unit: 'mm' }, units, { withUnit, digits: units === 'mm' ? 2 : 3 });

export const angleWords = (angleDeg: number) =>
  formatQuantity({ value: angleDeg, unit: 'deg' }, 'mm');

/** Beside a dimension line: "overrun 4 mm". */
export const dimensionWords = ({ name, mm }: Dimension, units: UnitSystem): string =>
  `${name}\u00a0${length(mm, units)}`;

/** The picture in words, one sentence for each thing that is drawn. */
export function setupSentences(
  scene: SetupScene,
  { input, plan }: { input: PlanInput; plan: Plan },
  units: UnitSystem,
): string[] {
  const sentences = [workWords(input, scene, units)];
  const overruns = scene.dimensions.filter(({ name }) => name === 'overrun');
  const overhang = scene.dimensions.find(({ name }) => name === 'overhang');
  const { wheelData: wheel } = input;
  if (wheel)
    sentences.push(
      `The wheel, ${length(wheel.diameterNowMm, units, false)} × ${length(wheel.widthMm, units)}, stands at the headstock’s end of its stroke; dashed, at the other.`,
    );
  if (overhang)
    sentences.push(
      `The quill or arbor reaches ${length(overhang.mm, units)} from its bearing to the front of the wheel.`,
    );
  sentences.push(...(overruns.length > 0 ? [overrunWords(overruns, units)] : []));
  const { travel } = plan.traverse;
  if (travel.value !== null && !plan.traverse.plunge)
    sentences.push(`One stroke is ${length(travel.value, units)} long.`);
  if (scene.compound) sentences.push(...compoundWords(scene.compound.angleDeg, plan, units));
  const setover = plan.taper?.setover?.value ?? null;
  if (setover !== null)
    sentences.push(
      `The tailstock is set over by ${length(setover, units)}, towards the wheel where the thin end stands there.`,
    );
  if (input.grinder?.wheelRotation ?? plan.work.rotation.work)
    sentences.push(`Directions: ${plan.work.rotation.note}. Arrows show where the tops go.`);
  sentences.push(
    'Seen from above, operator below. What is dotted is a hint: the sizes of chuck, centres, walls and grinder are not asked.',
  );
  return sentences;
}

function workWords(input: PlanInput, scene: SetupScene, units: UnitSystem): string {
  const { diameterMm, cone } = surfaceOf(input);
  const ground = scene.dimensions.find(({ name }) => name === 'ground');
  const small = cone?.smallDiameter.value ?? null;
  const across =
    small === null
      ? length(diameterMm ?? 0, units)
      : `${length(diameterMm ?? 0, units)} at the big end, ${length(Math.max(small, 0), units)} at the small`;
  const others = scene.dimensions
    .filter(
      ({ name }) => name === 'free length' || name === 'between centres' || name === 'free depth',
    )
    .map((dimension) => `, ${dimension.name} ${length(dimension.mm, units)}`);
  return `${WORK_NAMES[input.operation]} ${across}, ${length(ground?.mm ?? 0, units)} to grind${others.join('')}.`;
}

const WORK_NAMES: Record<PlanInput['operation'], string> = {
  jaws: 'Jaws closed on',
  bore: 'Bore of',
  outside: 'Work of',
  taper: 'Taper of',
};

function overrunWords(overruns: readonly Dimension[], units: UnitSystem): string {
  const [first] = overruns;
  const mm = length(first?.mm ?? 0, units);
  return overruns.length > 1
    ? `The wheel runs ${mm} past each end.`
    : `The wheel runs ${mm} past one end and stops at a shoulder at the other.`;
}

function compoundWords(angleDeg: number, plan: Plan, units: UnitSystem): string[] {
  const travel = plan.taper?.compound?.travel.value ?? null;
  const overrun = plan.traverse.overrun.value;
  return [
    `The compound travels at ${angleWords(angleDeg)} to the spindle axis${travel === null ? '' : `, ${length(travel, units)} with the overrun`}${overrun === null ? '' : ` of ${length(overrun, units)} past each end`}.`,
    'The grinder is drawn turned with the compound.',
  ];
}
