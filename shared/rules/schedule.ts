import { floorTo } from './figures';
import { sparkOutPasses, takePass } from './spring';
import type { Pass, PassStage } from './types';

/** Beyond this a list of passes helps nobody; the count alone is given. */
const MOST_LISTED = 400;
/** Rough spark-outs before measuring, at least and at most. */
const ROUGH_SPARK_OUTS = { least: 2, most: 3 };

export interface StageFeed {
  infeedMm: number;
  /** The smallest move that can be set in this stage, mm. */
  stepMm: number;
  divisionMm: number | null;
  cutFraction: number;
}

export interface ScheduleSpec {
  /** Metal to remove on radius, and how much of it is left for finishing, mm. */
  stockMm: number;
  finishStockMm: number;
  rough: StageFeed;
  finish: StageFeed;
  /** Spring that may stay at the end, mm. */
  springLeftMm: number;
  /** Spark-outs at the end; null works them out. */
  sparkOuts: number | null;
}

export interface Schedule {
  passes: Pass[];
  counts: Record<PassStage, number>;
  /** The sum of infeeds, mm. */
  fedMm: number;
}

/**
 * Infeed pass by pass: rough down to the finish stock, spark out, then finish and spark out again. The sum of
 * infeeds is what was asked, less at most one settable step of the finish, never more: the last step is taken
 * on the gauge. The spring of one stage carries over into the next.
 *
 * @param spec - stock and finish stock in mm on radius, infeed, settable step and cut fraction of each stage.
 * @returns the passes (empty when there are over 400), how many of each stage, and the sum of infeeds in mm.
 * @source derived-spring
 * @example planPasses({ stockMm: 0.1, finishStockMm: 0.02, rough: { infeedMm: 0.01, stepMm: 0.005, divisionMm: 0.01, cutFraction: 0.8 }, finish: { infeedMm: 0.005, stepMm: 0.005, divisionMm: 0.01, cutFraction: 0.9 }, springLeftMm: 0.0005, sparkOuts: null }).counts.rough // 8
 */
export function planPasses(spec: ScheduleSpec): Schedule {
  const roughMm = floorTo(Math.max(spec.stockMm - spec.finishStockMm, 0), spec.rough.stepMm);
  const finishMm = floorTo(Math.max(spec.stockMm - roughMm, 0), spec.finish.stepMm);
  const counts: Schedule['counts'] = {
    rough: passCount(roughMm, spec.rough.infeedMm),
    'rough spark-out': 0,
    finish: passCount(finishMm, spec.finish.infeedMm),
    'finish spark-out': 0,
  };
  const fedMm = roughMm + finishMm;
  if (counts.rough + counts.finish > MOST_LISTED) return { passes: [], counts, fedMm };

  const log = new PassLog(spec.stockMm, fedMm);
  log.feed('rough', roughMm, spec.rough);
  if (counts.rough > 0) {
    const wanted = sparkOutPasses(log.springMm, spec.springLeftMm, spec.rough.cutFraction);
    counts['rough spark-out'] = Math.min(
      Math.max(wanted, ROUGH_SPARK_OUTS.least),
      ROUGH_SPARK_OUTS.most,
    );
    log.sparkOut('rough spark-out', counts['rough spark-out'], spec.rough);
  }
  log.feed('finish', finishMm, spec.finish);
  counts['finish spark-out'] =
    spec.sparkOuts ?? sparkOutPasses(log.springMm, spec.springLeftMm, spec.finish.cutFraction);
  log.sparkOut('finish spark-out', counts['finish spark-out'], spec.finish);
  return { passes: log.passes, counts, fedMm };
}

function passCount(totalMm: number, infeedMm: number): number {
  return infeedMm > 0 ? Math.max(Math.ceil(totalMm / infeedMm - 1e-6), 0) : 0;
}

/** Writes passes down while it follows dial, metal and spring. */
class PassLog {
  readonly passes: Pass[] = [];
  springMm = 0;
  private cutMm = 0;
  private fedMm = 0;

  constructor(
    private readonly stockMm: number,
    private readonly askedMm: number,
  ) {}

  feed(stage: PassStage, totalMm: number, feed: StageFeed): void {
    const count = passCount(totalMm, feed.infeedMm);
    for (let pass = 1; pass <= count; pass += 1) {
      const last = pass === count;
      this.write(stage, last ? totalMm - (count - 1) * feed.infeedMm : feed.infeedMm, feed);
    }
  }

  sparkOut(stage: PassStage, count: number, feed: StageFeed): void {
    for (let pass = 0; pass < count; pass += 1) this.write(stage, 0, feed);
  }

  private write(stage: PassStage, infeedMm: number, feed: StageFeed): void {
    const taken = takePass(infeedMm, this.springMm, feed.cutFraction);
    this.springMm = taken.springMm;
    this.cutMm += taken.cutMm;
    this.fedMm += infeedMm;
    this.passes.push({
      number: this.passes.length + 1,
      stage,
      infeedMm,
      divisions: feed.divisionMm === null ? null : infeedMm / feed.divisionMm,
      cutMm: taken.cutMm,
      springMm: taken.springMm,
      dialToGoMm: Math.max(this.askedMm - this.fedMm, 0),
      metalToGoMm: Math.max(this.stockMm - this.cutMm, 0),
    });
  }
}
