import { planStage, type CutBasis, type StageCutPlan } from './cut-stage';
import { dialOf, type Dial } from './dial';
import { infeedCaps, withCap, type Cap } from './infeed';
import { positive } from './sizes';
import { handAims, traverseAims, type TraverseAims } from './traverse';
import { workRow, type WorkRow } from './work-table';

export interface CutPlan {
  dial: Dial | null;
  row: WorkRow | null;
  aims: TraverseAims;
  finishStockMm: number | null;
  rough: StageCutPlan | null;
  finish: StageCutPlan | null;
}

/**
 * Infeed and traverse of both stages: suggested within every cap, or as typed.
 *
 * @param basis - the setup and what was worked out before; null where unknown.
 * @returns rough and finish, null while material or wheel is unknown.
 * @source mh31-1318
 * @example planCut(basis).rough?.setting.divisions // 1.5
 */
export function planCut(basis: CutBasis): CutPlan {
  const { input, stockMm } = basis;
  const { rules, cut, wheelData, work, lathe } = input;
  const { depthPerInfeed, slide } = basis.surface;
  const perDepth = 1 / (depthPerInfeed ?? 1);
  const row = work.material === null ? null : fedAt(workRow(work.material), perDepth);
  const burnMm = basis.burnMm === null ? null : basis.burnMm * perDepth;
  const widthMm = wheelData?.widthMm ?? null;
  const shares = { rough: rules.roughTraverseShare, finish: rules.finishTraverseShare };
  const shared = traverseAims(widthMm, work.material, shares);
  const aims =
    slide === 'carriage'
      ? shared
      : handAims(shared, { perTurnMm: lathe?.compoundMmPerTurn ?? null, rpm: basis.latheRpm });
  const dial = dialOf(lathe, slide === 'carriage');
  const kept = positive(cut.finishStockMm) ?? rules.finishStockMm;
  const finishStockMm = stockMm === null ? null : Math.min(kept, stockMm);
  const known = { dial, row, aims, finishStockMm };
  if (row === null || aims.rough.value === null || aims.finish.value === null)
    return { ...known, rough: null, finish: null };

  const roughStockMm = stockMm === null || finishStockMm === null ? null : stockMm - finishStockMm;
  const roughCaps = infeedCaps(row, {
    roughStockMm,
    interrupted: basis.surface.interrupted,
    rules,
    burnMm,
    stepMm: dial?.stepMm ?? 0,
  });
  const rough = planStage(basis, {
    caps: roughCaps,
    typedInfeedMm: positive(cut.roughInfeedMm),
    typedTraverseMm: positive(cut.roughTraverseMmPerRev),
    aimMm: aims.rough.value,
    leastMm: Math.min(aims.finish.value, aims.rough.value),
    ceilingMm: row.roughInfeedMm,
    plungePerTurnMm: row.plungeInfeedMm.rough,
    dial,
  });
  const finishCaps: Cap[] = [
    { by: 'table', valueMm: row.finishInfeedMm.high },
    { by: 'shop', valueMm: rules.finishInfeedMm },
    ...(burnMm === null ? [] : [{ by: 'burn' as const, valueMm: burnMm }]),
  ];
  const finish = planStage(basis, {
    // Finishing never takes more than roughing was allowed.
    caps:
      rough === null || rough.typed
        ? finishCaps
        : withCap(finishCaps, { by: rough.by, valueMm: rough.setting.infeedMm }),
    typedInfeedMm: positive(cut.finishInfeedMm),
    typedTraverseMm: positive(cut.finishTraverseMmPerRev),
    aimMm: aims.finish.value,
    leastMm: aims.finish.value,
    ceilingMm: row.finishInfeedMm.high,
    plungePerTurnMm: row.plungeInfeedMm.finish,
    dial,
  });
  return { ...known, rough, finish };
}

/** The table's depths as moves of the slide that feeds; on a cone it moves further than it cuts. */
function fedAt(row: WorkRow, perDepth: number): WorkRow {
  const { finishInfeedMm, plungeInfeedMm } = row;
  return {
    ...row,
    roughInfeedMm: row.roughInfeedMm * perDepth,
    finishInfeedMm: { low: finishInfeedMm.low * perDepth, high: finishInfeedMm.high * perDepth },
    plungeInfeedMm: {
      rough: plungeInfeedMm.rough * perDepth,
      finish: plungeInfeedMm.finish * perDepth,
    },
  };
}
