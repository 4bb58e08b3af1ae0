import { Circle, Line } from 'react-native-svg';

import { useShop } from '@/features/session';
import { Picture, PictureText } from '@/features/ui/picture';
import { Body, Small } from '@/features/ui/text';
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
  return (
    <>
      <Body>{CAUTIONS['look-and-ring'].words}</Body>
      <Picture
        description="A wheel seen from its face, tapped at 45 degrees to the left and to the right of the top, near the rim."
        height={() => SIZE}
        caption={`Tap ${near} to ${far} from the rim. Clear note: go on. Dull note: set it aside.`}
      >
        {({ textScale }) => (
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
              return <Circle key={side} cx={cx + at.x} cy={cx + at.y} r={7} fill={colors.spark} />;
            })}
            <PictureText x={SIZE + 8} y={cx - 20} textScale={textScale}>
              tap here, and here
            </PictureText>
          </>
        )}
      </Picture>
      {wheel.diameterNowMm <= SMALL_MM ? (
        <Small>{CAUTIONS['small-wheels-look'].words}</Small>
      ) : null}
    </>
  );
}

/** 4 in and under: one state rule asks no ring test of them (rules, section 10). */
const SMALL_MM = 101.6;
