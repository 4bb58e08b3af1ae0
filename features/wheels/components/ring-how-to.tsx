import { StyleSheet, View } from 'react-native';
import { Circle, Line } from 'react-native-svg';

import { useShop } from '@/features/session';
import { Cell, Row } from '@/features/ui/card';
import { Picture } from '@/features/ui/picture';
import { Body, Strong } from '@/features/ui/text';
import { colors } from '@/features/ui/tokens';
import type { RackWheel } from '@/shared/domain/wheels';
import { CAUTIONS } from '@/shared/rules/cautions';
import { formatQuantity } from '@/shared/units/format';

const SIZE = 150;
const RADIUS = 64;
/** How far from the upright the wheel is tapped, degrees. */
const TAP_DEG = 45;
const TAP_AT = 0.74;

const tap = (side: -1 | 1, radius: number) => {
  const angle = (TAP_DEG * Math.PI) / 180;
  return { x: side * radius * Math.sin(angle), y: -radius * Math.cos(angle) };
};

/** How a ring test is done, in words and drawn; small wheels are told that the look decides. */
export function RingHowTo({ wheel }: { wheel: RackWheel }) {
  const { units } = useShop();
  const near = formatQuantity({ value: 25, unit: 'mm' }, units, { withUnit: false });
  const far = formatQuantity({ value: 50, unit: 'mm' }, units);
  const cx = SIZE / 2;
  const isSmall = wheel.diameterNowMm <= SMALL_MM;
  return (
    <>
      {isSmall ? <Strong>{CAUTIONS['small-wheels-look'].words}</Strong> : null}
      <Body>{CAUTIONS['look-and-ring'].words}</Body>
      <Row align="center">
        <View style={styles.drawing}>
          <Picture
            description="A wheel seen from its face, tapped at 45 degrees to the left and to the right of the top, near the rim. A clear note: go on. A dull note: set it aside."
            height={() => SIZE}
          >
            {() => (
              <>
                <Circle
                  cx={cx}
                  cy={cx}
                  r={RADIUS}
                  fill={colors.well}
                  stroke={colors.metalEdge}
                  strokeWidth={2}
                />
                <Circle
                  cx={cx}
                  cy={cx}
                  r={12}
                  fill={colors.sheet}
                  stroke={colors.metalEdge}
                  strokeWidth={2}
                />
                <Line
                  x1={cx}
                  x2={cx}
                  y1={cx - RADIUS - 8}
                  y2={cx}
                  stroke={colors.outline}
                  strokeDasharray="4 4"
                />
                {([-1, 1] as const).map((side) => {
                  const at = tap(side, RADIUS * TAP_AT);
                  return (
                    <Circle key={side} cx={cx + at.x} cy={cx + at.y} r={7} fill={colors.spark} />
                  );
                })}
              </>
            )}
          </Picture>
        </View>
        <Cell least={140}>
          <Body>{`Tap here, and here, ${isSmall ? 'near' : `${near} to ${far} from`} the rim.`}</Body>
          <Strong>Clear note: go on.</Strong>
          <Strong tone="stop">Dull note: set it aside.</Strong>
        </Cell>
      </Row>
    </>
  );
}

/** 4 in and under: one state rule asks no ring test of them (rules, section 10). */
const SMALL_MM = 101.6;

const styles = StyleSheet.create({ drawing: { width: SIZE } });
