import type { ShopRules } from '../domain/shop-rules';
import type { CutPlan } from './cut-plan';
import type { StageCutPlan } from './cut-stage';
import { finding } from './findings';
import { quantity } from './figures';
import type { Schedule } from './schedule';
import type { Surface } from './surface';
import type { Figure, Finding } from './types';

const DOUBT = 1e-9;

/**
 * What is unwise about infeeds, spring and the number of passes.
 *
 * @param spec - the cut, its rough lag, the schedule (null while unknown), stock in mm, the slide that
 * traverses and the shop's rules.
 * @returns findings.
 * @source mh31-1318
 * @example cutFindings({ cut: planCut(basis), lag: stated('lag', [0.02, 'mm']), schedule: null, stockMm: 0.1, slide: 'carriage', rules })[0]?.code // 'lag-above-limit'
 */
export function cutFindings(spec: {
  cut: CutPlan;
  lag: Figure;
  schedule: Schedule | null;
  stockMm: number | null;
  slide: Surface['slide'];
  rules: ShopRules;
}): Finding[] {
  const { cut, lag, schedule, stockMm, rules } = spec;
  const found: Finding[] = [];
  if (cut.row !== null && cut.rough !== null)
    found.push(...stageFindings('rough', cut.rough, cut.row.roughInfeedMm));
  if (cut.row !== null && cut.finish !== null)
    found.push(...stageFindings('finish', cut.finish, cut.row.finishInfeedMm.high));
  found.push(...dialFindings(cut, spec.slide));
  if (lag.value !== null && lag.value > rules.lagLimitMm + DOUBT)
    found.push(
      finding('lag-above-limit', {
        figures: { lag: quantity(lag.value, 'mm'), limit: quantity(rules.lagLimitMm, 'mm') },
      }),
    );
  const passes = schedule === null ? 0 : schedule.counts.rough + schedule.counts.finish;
  if (schedule !== null && schedule.passes.length === 0 && passes > 0 && stockMm !== null)
    found.push(
      finding('many-passes', {
        figures: { stock: quantity(stockMm, 'mm'), passes: quantity(passes, 'passes') },
      }),
    );
  return found;
}

/** Above the table is a Check; above what the shop aims at, a note. */
function stageFindings(stage: string, plan: StageCutPlan, tableMm: number): Finding[] {
  const { infeedMm } = plan.setting;
  const infeed = quantity(infeedMm, 'mm');
  if (infeedMm > tableMm + DOUBT)
    return [
      finding('infeed-above-table', {
        figures: { infeed, limit: quantity(tableMm, 'mm') },
        names: { stage },
      }),
    ];
  const aimed = Math.min(...plan.caps.map(({ valueMm }) => valueMm));
  return plan.typed && infeedMm > aimed + DOUBT
    ? [
        finding('infeed-above-usual', {
          figures: { infeed, limit: quantity(aimed, 'mm') },
          names: { stage },
        }),
      ]
    : [];
}

function dialFindings({ dial, rough, finish }: CutPlan, slide: Surface['slide']): Finding[] {
  if (dial === null) return [];
  const found: Finding[] = [];
  const coarse = [finish, rough].find((stage) => stage !== null && isCoarse(stage));
  if (coarse?.setting.compoundAngle != null && coarse.setting.compoundAngle.value !== null)
    found.push(
      finding(slide === 'compound' ? 'dial-too-coarse-on-taper' : 'dial-too-coarse', {
        level: coarse.setting.settable ? 'note' : 'check',
        figures: {
          half: quantity(dial.stepMm, 'mm'),
          infeed: quantity(coarse.wantedMm, 'mm'),
          angle: quantity(coarse.setting.compoundAngle.value, 'deg'),
        },
      }),
    );
  for (const stage of [rough, finish]) {
    if (stage === null || !stage.typed || isCoarse(stage)) continue;
    if (Math.abs(stage.setting.infeedMm - stage.wantedMm) > 1e-6)
      found.push(
        finding('infeed-not-settable', {
          figures: {
            asked: quantity(stage.wantedMm, 'mm'),
            infeed: quantity(stage.setting.infeedMm, 'mm'),
            division: quantity(dial.divisionMm, 'mm'),
          },
        }),
      );
  }
  return found;
}

function isCoarse({ setting }: StageCutPlan): boolean {
  return setting.compoundAngle !== null;
}
