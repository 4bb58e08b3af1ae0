import { MarkingFold, sourceWords } from '@/features/plan';
import { Stack } from '@/features/ui/card';
import { Fold } from '@/features/ui/fold';
import { List, ListRow } from '@/features/ui/list-row';
import { Body, Small, Strong } from '@/features/ui/text';
import { parseMarking } from '@/shared/rules/marking';
import {
  recommendedMark,
  scoreMark,
  writeRecommended,
  type RecommendedMark,
} from '@/shared/rules/recommended-marks';
import { surfaceOf } from '@/shared/rules/surface';

import { usePlanner } from '../planner-context';
import { MATERIAL_WORDS } from '../words';

/** The chosen wheel's mark in words, and the marks that the handbook recommends beside it. */
export function WheelMarks() {
  const { values, wheel } = usePlanner();
  const { typed, wheelId } = values.inputs.wheel;
  const chosen = typed !== null || (wheelId !== null && wheel !== null);
  const marking = typed ? typed.marking : (wheel?.data.marking ?? null);
  return (
    <Stack gap={1}>
      {chosen ? <MarkingFold marking={marking} /> : null}
      <RecommendedFold marking={marking} chosen={chosen} />
    </Stack>
  );
}

function RecommendedFold({ marking, chosen }: { marking: string | null; chosen: boolean }) {
  const { values } = usePlanner();
  const { material } = values.inputs.work;
  if (material === null) return null;
  const { side, diameterMm } = surfaceOf(values.inputs);
  const recommended = recommendedMark(material, side, diameterMm);
  const written = writeRecommended(recommended);
  const parsed = marking === null ? null : parseMarking(marking);
  const score = parsed?.ok ? scoreMark(parsed.marking, material, recommended) : null;
  const work = `${MATERIAL_WORDS[material]}, ${side === 'outside' ? 'outside' : 'in a bore or jaws'}`;
  return (
    <Fold label="Marks the handbook recommends for this work" value={written}>
      <Stack gap={3}>
        <List label="Recommended marks">
          <ListRow label="Recommended" detail={work} aside={<Strong>{written}</Strong>} />
          {chosen ? (
            <ListRow
              label="This wheel"
              detail={score ? 'points of 100' : 'not compared'}
              aside={<Strong>{score ? String(score.score) : '–'}</Strong>}
            />
          ) : null}
        </List>
        {score ? (
          <Body>{score.reasons.join(' ')}</Body>
        ) : chosen ? (
          <Body>Its marking does not read, so it cannot be compared.</Body>
        ) : null}
        <Small>{sourceOf(recommended)}</Small>
      </Stack>
    </Fold>
  );
}

function sourceOf({ source }: RecommendedMark): string {
  const { title, place, mark } = sourceWords(source);
  return `${[title, place].filter(Boolean).join(', ')}. ${mark}. The points are our own reckoning: abrasive 40, grain and grade 25 each, bond 10.`;
}
