import type { Operation, PlanInput } from '../domain/setups';
import { GUARDING_CAUTIONS } from './cautions-guarding';
import { WORKING_CAUTIONS } from './cautions-working';
import type { Caution } from './caution';
import { kindOf } from './surface';

/** Every caution, in the order the Board shows them; what comes first stands above all others. */
export const CAUTIONS = {
  'marking-first': {
    subject: 'First of all',
    words:
      "The wheel's marking, the makers' manuals, local law and a competent person come before anything said here.",
    source: 'osha-1910-215-d1',
  },
  ...GUARDING_CAUTIONS,
  ...WORKING_CAUTIONS,
} as const satisfies Record<string, Caution>;

export type CautionId = keyof typeof CAUTIONS;

/** What a plan is like, as far as its cautions depend on it. */
interface Circumstances {
  /** A taper is also what its surface is like. */
  operations: readonly Operation[];
  mounted: boolean;
  material: PlanInput['work']['material'];
}

/**
 * The cautions that belong to a plan. They always hold, and never colour its verdict.
 *
 * @param input - the setup with its wheel.
 * @returns ids into CAUTIONS, in their order there.
 * @source none: which belongs where follows from each caution's own source
 * @example cautionsFor(planInput).includes('jaws-fixed') // true
 */
export function cautionsFor(input: PlanInput): CautionId[] {
  const circumstances: Circumstances = {
    operations: [input.operation, kindOf(input)],
    mounted: input.wheelData?.mounted != null,
    material: input.work.material,
  };
  return CAUTION_IDS.filter((id) => belongs(CAUTIONS[id], circumstances));
}

function belongs(caution: Caution, { operations, mounted, material }: Circumstances): boolean {
  const { operations: only } = caution;
  if (only !== undefined && !operations.some((operation) => only.includes(operation))) return false;
  if (caution.mounted !== undefined && caution.mounted !== mounted) return false;
  return (
    caution.materials === undefined || (material !== null && caution.materials.includes(material))
  );
}

const CAUTION_IDS = Object.keys(CAUTIONS).filter((id): id is CautionId => id in CAUTIONS);
