import { Circle, G, Line, Path } from 'react-native-svg';

import { PictureText, wordsWidth } from '@/features/ui/picture';
import { polar } from '@/features/ui/polar';
import { colors } from '@/features/ui/tokens';
import type { UnitSystem } from '@/shared/domain/people';
import type { JawContact, JawPlan } from '@/shared/rules/types';

import {
  chuckLayout,
  hasFullLabels,
  jawOutline,
  pixelsPerMm,
  ring,
  type ChuckLayout,
} from './jaw-geometry';
import { jawLabel } from './jaw-words';

interface ChuckDrawingProps {
  plan: JawPlan;
  boreMm: number;
  padWidthMm: number;
  units: UnitSystem;
  /** How many times too large offsets are drawn. */
  times: number;
  width: number;
  textScale: number;
}

/** Chuck face, jaws, the wheel's path at the first touch, and the offset of the jaws from the axis. */
export function ChuckDrawing(props: ChuckDrawingProps) {
  const { plan, boreMm, padWidthMm, times, width, textScale } = props;
  const layout = chuckLayout(width, plan, textScale);
  const { centre, pathRadius, faceRadius } = layout;
  const offset = pixelsPerMm(layout, boreMm) * times * plan.eccentricityMm;
  return (
    <>
      <G x={centre.x} y={centre.y}>
        <Path d={ring(pathRadius, faceRadius)} fill={colors.well} stroke={colors.rule} />
      </G>
      {plan.contacts.map((contact) => (
        <Path
          key={contact.jaw}
          fill={colors.metal}
          stroke={colors.metalEdge}
          strokeWidth={1.5}
          strokeLinejoin="round"
          d={jawOutline({ plan, contact, layout, times, boreMm, padWidthMm })}
        />
      ))}
      <Circle
        cx={centre.x}
        cy={centre.y}
        r={pathRadius}
        fill="none"
        stroke={colors.spark}
        strokeWidth={2.5}
        strokeDasharray="9 6"
      />
      <Offset
        layout={layout}
        length={offset}
        highSpotDeg={plan.highSpotDeg}
        textScale={textScale}
      />
      {plan.contacts.map((contact) => (
        <JawLabel key={contact.jaw} {...props} layout={layout} contact={contact} />
      ))}
    </>
  );
}

interface OffsetProps {
  layout: ChuckLayout;
  length: number;
  highSpotDeg: number;
  textScale: number;
}

/** From the spindle axis to the middle of the jaws; its word stands on the other side of the axis. */
function Offset({ layout: { centre }, length, highSpotDeg, textScale }: OffsetProps) {
  const middle = polar(centre, length, highSpotDeg);
  const wordBelow = middle.y <= centre.y;
  return (
    <>
      <Line
        x1={centre.x}
        y1={centre.y}
        x2={middle.x}
        y2={middle.y}
        stroke={colors.metalEdge}
        strokeWidth={2}
      />
      <Circle
        cx={middle.x}
        cy={middle.y}
        r={4}
        fill={colors.page}
        stroke={colors.metalEdge}
        strokeWidth={2}
      />
      <Circle cx={centre.x} cy={centre.y} r={4} fill={colors.metalEdge} />
      <PictureText
        x={centre.x}
        y={centre.y + (wordBelow ? 20 : -11) * textScale}
        anchor="middle"
        color="textSoft"
        size="small"
        textScale={textScale}
      >
        offset
      </PictureText>
    </>
  );
}

interface JawLabelProps extends ChuckDrawingProps {
  layout: ChuckLayout;
  contact: JawContact;
}

/** Beside a jaw that stands up or down, under the end of any other; always inside the drawing. */
function JawLabel({ plan, contact, layout, units, boreMm, padWidthMm, ...size }: JawLabelProps) {
  const jaws = plan.contacts.length;
  const full = hasFullLabels(plan, size.width, size.textScale);
  const words = full ? jawLabel(contact, jaws, units) : String(contact.jaw);
  const { centre, outerRadius } = layout;
  const angle = (contact.angleDeg * Math.PI) / 180;
  const halfPad = (padWidthMm * pixelsPerMm(layout, boreMm)) / 2;
  const line = 14 * size.textScale;
  const upright = Math.abs(Math.sin(angle)) < 0.3;
  const end = polar(centre, outerRadius + (full ? 0 : 12), contact.angleDeg);
  const half = wordsWidth(words, 'body', size.textScale) / 2 + 2;
  const underEnd = end.y + halfPad * Math.abs(Math.sin(angle)) + line + 2;
  const place =
    full && upright
      ? {
          x: end.x + halfPad + 8,
          y: end.y + (end.y < centre.y ? line : -4),
          anchor: 'start' as const,
        }
      : {
          x: Math.min(Math.max(end.x, half), size.width - half),
          y: full ? underEnd : end.y + line / 3,
          anchor: 'middle' as const,
        };
  return (
    <PictureText {...place} strong textScale={size.textScale}>
      {words}
    </PictureText>
  );
}
