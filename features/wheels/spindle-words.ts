import type { WheelLife } from '@/shared/contracts/wheel-entries';
import type { UnitSystem } from '@/shared/domain/people';
import type { SpeedLimit } from '@/shared/rules/types';
import { formatQuantity } from '@/shared/units/format';

export type Spindle = WheelLife['spindles'][number];

const LIMIT_OF: Record<SpeedLimit['kind'], string> = {
  'marked rpm': 'by the marked rpm',
  'marked speed': 'by the marked speed',
  unmarked: 'nothing is marked',
  'maker, mounted': "by the maker's figure",
  'quill marked': 'marked on the quill',
  'quill bending': 'by the bending of the quill',
  'grinder spindle': "by the grinder's spindle",
};

const limitOf = (kind: string) =>
  Object.entries(LIMIT_OF).find(([known]) => known === kind)?.[1] ?? kind;

const rpmWords = (value: number, units: UnitSystem, rounding: 'up' | 'down') =>
  formatQuantity({ value, unit: 'rpm' }, units, { rounding });

/** "limit 16 700 rpm, by the marked rpm" */
export const spindleLimitWords = ({ limitRpm, limitOf: kind }: Spindle, units: UnitSystem) =>
  `limit ${rpmWords(limitRpm, units, 'down')}, ${limitOf(kind)}`;

/** Which belt steps the wheel may turn at, and which are too fast. */
export function stepsWords({ steps }: Spindle, units: UnitSystem): string {
  const allowed = steps.filter((step) => step.allowed).map(({ name }) => name);
  const locked = steps.filter((step) => !step.allowed);
  if (allowed.length === 0) return 'too fast on every belt step';
  const steady =
    allowed.length === 1 ? `belt step ${allowed[0] ?? ''}` : `belt steps ${allowed.join(', ')}`;
  if (locked.length === 0)
    return allowed.length === 1 ? steady : `every ${steady}`.replace('steps', 'step:');
  const not = locked.map(({ name, rpm }) => `${name}: ${rpmWords(rpm, units, 'up')}`);
  return `${steady}, not ${not.join(', ')}`;
}
