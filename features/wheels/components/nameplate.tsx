import { StyleSheet, View } from 'react-native';

import { FigureReadout } from '@/features/plan';
import { NOT_GIVEN } from '@/features/records';
import { Card } from '@/features/ui/card';
import { Readout, ReadoutRow } from '@/features/ui/readout';
import { Display, Engraved, Small } from '@/features/ui/text';
import { space } from '@/features/ui/tokens';
import type { UnitSystem } from '@/shared/domain/people';
import type { RackWheel } from '@/shared/domain/wheels';
import { formatQuantity } from '@/shared/units/format';

import { speedWords, type SpeedUnit } from '../marked-speed';
import { sizeWords } from '../sizes';
import { governingLimit } from '../standing';
import { MARKING_PLACE_WORDS } from '../words';

/** What a plate can show while a wheel is still being typed in. */
export type PlateWheel = Pick<
  RackWheel,
  'marking' | 'shape' | 'markedRpm' | 'markedSpeedMPerS' | 'markingReadOn' | 'mounted'
> & { diameterNewMm: number | null; widthMm: number | null; holeMm: number | null };

interface NameplateProps {
  tag: string;
  wheel: PlateWheel;
  speedUnit: SpeedUnit;
  units: UnitSystem;
  /** An unmarked wheel that is only being typed in shows no limit yet. */
  typing?: boolean;
}

/** The wheel as its own label would show it, with the limit that governs it. Stands in a PlanReader. */
export function Nameplate({ tag, wheel, speedUnit, units, typing = false }: NameplateProps) {
  const sizes = [wheel.diameterNewMm, wheel.widthMm, wheel.holeMm].filter((size) => size !== null);
  return (
    <Card kind="engraved">
      <View style={styles.head}>
        <Engraved>
          {[tag || 'no tag', wheel.shape === null ? '' : `type ${wheel.shape}`]
            .filter(Boolean)
            .join(' · ')}
        </Engraved>
        <Small>
          {wheel.markingReadOn === null
            ? 'marking: place not recorded'
            : `marking read ${MARKING_PLACE_WORDS[wheel.markingReadOn]}`}
        </Small>
      </View>
      <Display level={2}>{wheel.marking ?? (typing ? NOT_GIVEN : 'not legible')}</Display>
      <ReadoutRow>
        <Readout
          label="New"
          size="small"
          value={sizes.length === 0 ? null : sizeWords(sizes, { units })}
        />
        <Readout label="Marked" size="small" value={markedWords(wheel, speedUnit)} />
        <Limit wheel={wheel} typing={typing} />
      </ReadoutRow>
    </Card>
  );
}

function markedWords(
  { markedRpm, markedSpeedMPerS }: PlateWheel,
  speedUnit: SpeedUnit,
): string | null {
  const marks = [
    markedSpeedMPerS === null ? '' : speedWords(markedSpeedMPerS, speedUnit),
    markedRpm === null ? '' : formatQuantity({ value: markedRpm, unit: 'rpm' }, 'mm'),
  ].filter(Boolean);
  return marks.length === 0 ? null : marks.join(', ');
}

function Limit({ wheel, typing }: { wheel: PlateWheel; typing: boolean }) {
  const { diameterNewMm } = wheel;
  const limit = diameterNewMm === null ? null : governingLimit({ ...wheel, diameterNewMm });
  if (limit === null || (typing && limit.kind === 'unmarked'))
    return <Readout label="Limit" size="small" value={null} />;
  return (
    <FigureReadout label="Limit" size="small" figure={limit.rpm} options={{ rounding: 'down' }} />
  );
}

const styles = StyleSheet.create({
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    columnGap: space[4],
  },
});
