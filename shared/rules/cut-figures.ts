import type { StageCutPlan } from './cut-stage';
import { assumedTerm, figure, stated, term } from './figures';
import { steadyLag } from './spring';
import { squareTo, type Surface } from './surface';
import type { Figure } from './types';

const CAP_WORDS: Record<StageCutPlan['by'], string> = {
  table: 'most in the table, or where interrupted work starts',
  shop: "the shop's largest",
  stock: 'a third of the stock to rough off',
  burn: 'under the burning threshold when dry',
  lag: 'within the spring allowed',
  power: "within the motor's power",
  dial: 'what the dial can set',
  typed: 'as chosen',
};

/**
 * A figure that nothing is known about yet.
 *
 * @param unit - unit of the figure.
 * @param meaning - what it will be.
 * @returns a figure without a value.
 */
export function unknown(unit: Figure['unit'], meaning: string): Figure {
  return stated(meaning, [null, unit]);
}

/**
 * The infeed of a stage as it will be set, with every cap that it stays under.
 *
 * @param stage - the planned stage; null while unknown.
 * @returns mm on radius.
 */
export function infeedFigure(stage: StageCutPlan | null): Figure {
  if (stage === null) return unknown('mm', 'infeed on radius');
  const { setting, wantedMm, by, typed, caps } = stage;
  const terms = typed
    ? [term('a', CAP_WORDS.typed, [wantedMm, 'mm'])]
    : [
        ...caps.map((cap) =>
          (cap.by === 'shop' ? assumedTerm : term)(`a_${cap.by}`, CAP_WORDS[cap.by], [
            cap.valueMm,
            'mm',
          ]),
        ),
        ...(caps.some((cap) => cap.by === by)
          ? []
          : [term(`a_${by}`, CAP_WORDS[by], [wantedMm, 'mm'])]),
      ];
  return figure({
    unit: 'mm',
    formula: typed ? '{a}' : `the least of ${terms.map(({ symbol }) => `{${symbol}}`).join(', ')}`,
    source: typed ? 'entered' : by === 'table' ? 'mh31-1318' : 'practice-dial',
    terms,
    compute: () => setting.infeedMm,
    note: 'On radius, rounded down to what the dial can set.',
  });
}

/**
 * Traverse of a stage per work revolution, from the aim to the feed that is there.
 *
 * @param stage - the planned stage; null while unknown.
 * @param aim - traverse aimed at, mm per work revolution.
 * @param typed - whether the traverse was chosen by hand.
 * @returns mm per work revolution; null where the wheel plunges.
 */
export function traverseFigure(stage: StageCutPlan | null, aim: Figure, typed: boolean): Figure {
  if (stage === null) return unknown('mm/rev', 'traverse per work revolution');
  const { traverseMm } = stage;
  if (traverseMm === null) return noTraverse();
  if (typed) return stated('traverse, chosen', [traverseMm, 'mm/rev']);
  return figure({
    unit: 'mm/rev',
    formula: stage.byHand ? '{s}' : "the lathe's largest feed up to {s}",
    source: aim.working.source,
    terms: [term('s', 'traverse aimed at', [aim.value, 'mm/rev'])],
    compute: () => traverseMm,
    note:
      aim.value !== null && traverseMm < aim.value / 1.5
        ? 'Cut below the share of the wheel before the infeed is.'
        : 'A share of the wheel, for each turn of the work.',
  });
}

/**
 * What stays as spring between even passes of a stage.
 *
 * @param stage - the planned stage; null while unknown.
 * @param surface - the ground surface.
 * @returns mm.
 */
export function lagFigure(
  stage: StageCutPlan | null,
  surface: Pick<Surface, 'depthPerInfeed'>,
): Figure {
  return figure({
    unit: 'mm',
    formula: '{a} (1 - {K}) / {K}',
    source: 'derived-spring',
    terms: [
      term('a', 'depth of cut, square to the surface', [
        squareTo(surface, stage?.setting.infeedMm ?? null),
        'mm',
      ]),
      term('K', 'cut fraction', [stage?.fraction.value ?? null, '1']),
    ],
    compute: steadyLag,
    note: 'In the steady state each pass takes the whole infeed; only the first ones take less.',
  });
}

/** Where the wheel covers the whole surface there is nothing to traverse. */
function noTraverse(): Figure {
  return figure({
    unit: 'mm/rev',
    formula: '{s}',
    source: 'mh31-1318',
    terms: [term('s', 'traverse', [null, 'mm/rev'])],
    compute: () => null,
    note: 'The wheel covers the surface: it plunges, without traverse.',
  });
}

/**
 * Infeed for each turn of the work when plunging.
 *
 * @param stage - the planned stage; null while unknown.
 * @returns mm per work revolution; null where the wheel traverses.
 */
export function perTurnFigure(stage: StageCutPlan | null): Figure {
  return figure({
    unit: 'mm/rev',
    formula: '{f}',
    source: 'mh31-1318',
    terms: [
      term('f', 'infeed for each turn of the work', [stage?.plunge?.perTurnMm ?? null, 'mm/rev']),
    ],
    compute: (f) => f,
    note: "The table's, less where spring or power asks for it.",
  });
}

/**
 * Seconds to stay at each setting when plunging, until the turns it takes have gone by.
 *
 * @param stage - the planned stage; null while unknown.
 * @param latheRpm - lathe speed.
 * @returns seconds; null where the wheel traverses.
 */
export function secondsPerSetting(stage: StageCutPlan | null, latheRpm: Figure): Figure {
  return figure({
    unit: 's',
    formula: '60 {N} / {n_w}',
    source: 'derived-time',
    terms: [
      term('N', 'turns of the work at each setting', [stage?.plunge?.turns ?? null, '1']),
      term('n_w', 'lathe speed', [latheRpm.value, 'rpm']),
    ],
    compute: (turns, rpm) => (60 * turns) / rpm,
  });
}
