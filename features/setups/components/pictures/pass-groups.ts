import type { UnitSystem } from '@/shared/domain/people';
import type { Pass, PassStage } from '@/shared/rules/types';
import { formatQuantity } from '@/shared/units/format';

/** Passes of one stage that are set alike. */
export interface PassGroup {
  first: number;
  last: number;
  stage: PassStage;
  infeedMm: number;
  divisions: number | null;
  /** As they stand after the last pass of the group. */
  metalToGoMm: number;
  dialToGoMm: number;
  springMm: number;
}

export const isFinish = (stage: PassStage) => stage === 'finish' || stage === 'finish spark-out';
const isSparkOut = (stage: PassStage) => stage.endsWith('spark-out');

const ALIKE_MM = 1e-9;

/** Neighbouring passes that are set alike, as one row each. */
export function groupPasses(passes: readonly Pass[]): PassGroup[] {
  const groups: PassGroup[] = [];
  for (const pass of passes) {
    const group = groups.at(-1);
    const after = {
      last: pass.number,
      metalToGoMm: pass.metalToGoMm,
      dialToGoMm: pass.dialToGoMm,
      springMm: pass.springMm,
    };
    if (group?.stage === pass.stage && Math.abs(group.infeedMm - pass.infeedMm) < ALIKE_MM)
      Object.assign(group, after);
    else
      groups.push({
        first: pass.number,
        stage: pass.stage,
        infeedMm: pass.infeedMm,
        divisions: pass.divisions,
        ...after,
      });
  }
  return groups;
}

/** "1–9 rough", "10–12 spark-out" */
export function groupName({ first, last, stage }: PassGroup): string {
  const numbers = first === last ? String(first) : `${first}–${last}`;
  return `${numbers} ${isSparkOut(stage) ? 'spark-out' : stage}`;
}

/** "+5 div each"; a spark-out leaves the dial where it stands. */
export function dialWords(group: PassGroup, units: UnitSystem): string {
  if (isSparkOut(group.stage)) return 'leave';
  const each = group.first === group.last ? '' : ' each';
  if (group.divisions === null) return `+${infeedWords(group, units)}${each}`;
  return `+${formatQuantity({ value: group.divisions, unit: 'div' }, units, { digits: 1 })}${each}`;
}

/** "0.0125": infeeds keep the half micron of a half division. */
export const infeedWords = (group: PassGroup, units: UnitSystem): string =>
  isSparkOut(group.stage)
    ? ''
    : formatQuantity({ value: group.infeedMm, unit: 'mm' }, units, { digits: 4, withUnit: false });

export const lengthWords = (value: number, units: UnitSystem): string =>
  formatQuantity({ value, unit: 'mm' }, units, { fixed: true, withUnit: false });

/** What is done between the rough and the finish passes; the dial starts again from zero. */
export const BETWEEN_STAGES = 'Measure cold, dress fine, touch off, set the dial to zero';
