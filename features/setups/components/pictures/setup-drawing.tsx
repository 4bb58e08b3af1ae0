import { G, Line, Path, Rect } from 'react-native-svg';

import { PictureText, wordsWidth } from '@/features/ui/picture';
import type { Point } from '@/features/ui/polar';
import { colors, pictureType } from '@/features/ui/tokens';

import type { SetupLayout } from './setup-layout';
import type { SetupScene, ShapeKind } from './setup-scene';
import { angleWords } from './setup-words';

interface SetupDrawingProps {
  scene: SetupScene;
  layout: SetupLayout;
  width: number;
  textScale: number;
}

const DASH = '6 4';
const DOTS = '2 4';
const CENTRE_LINE = '14 4 3 4';
const LABEL_GAP = 12;

const PAINT: Record<ShapeKind, { fill: string; stroke: string; dash?: string }> = {
  work: { fill: colors.metal, stroke: colors.metalEdge },
  section: { fill: colors.metal, stroke: 'none' },
  wheel: { fill: colors.well, stroke: colors.metalEdge },
  'wheel at the other end': { fill: 'none', stroke: colors.metalEdge, dash: DASH },
  quill: { fill: colors.bar, stroke: colors.metalEdge },
  hint: { fill: 'none', stroke: colors.outline, dash: DOTS },
};

/** Work, wheel and quill from above, on one scale; words stand outside. */
export function SetupDrawing({ scene, layout, width, textScale }: SetupDrawingProps) {
  const { place } = layout;
  const outline = (points: readonly Point[]) =>
    `M${points
      .map(place)
      .map(({ x, y }) => `${x.toFixed(1)},${y.toFixed(1)}`)
      .join('L')}Z`;
  return (
    <>
      <Ends width={width} textScale={textScale} />
      {scene.shapes.map(({ kind, points }, index) => {
        const { fill, stroke, dash } = PAINT[kind];
        return (
          <Path
            key={index}
            d={outline(points)}
            fill={fill}
            stroke={stroke}
            strokeWidth={1.5}
            strokeDasharray={dash}
            strokeLinejoin="round"
          />
        );
      })}
      <Stroke
        ends={scene.axis.map(place)}
        color={colors.outline}
        dash={CENTRE_LINE}
        strokeWidth={1}
      />
      <Stroke ends={scene.ground.map(place)} color={colors.spark} strokeWidth={3} />
      {scene.compound ? (
        <Compound compound={scene.compound} layout={layout} width={width} textScale={textScale} />
      ) : null}
      {[scene.workArrow, scene.wheelArrow].map((arrow, index) =>
        arrow ? <TurnArrow key={index} ends={arrow.map(place)} /> : null,
      )}
      <Dimensions layout={layout} textScale={textScale} />
    </>
  );
}

/** Lines first, words over them on the ground of the sheet, so that no line runs through a word. */
function Dimensions({
  layout: { marks, foot },
  textScale,
}: Omit<SetupDrawingProps, 'scene' | 'width'>) {
  const small = pictureType.small * textScale;
  return (
    <>
      {marks.flatMap(({ words, from, to, y }) =>
        [from, to].map((x) => (
          <Line key={`${words} ${x}`} x1={x} x2={x} y1={foot + 2} y2={y + 4} stroke={colors.rule} />
        )),
      )}
      {marks.map(({ words, from, to, y, wordsAt }) => {
        const half = wordsWidth(words, 'small', textScale) / 2;
        const baseline = y - 5 * textScale;
        return (
          <G key={`${words} ${from}`}>
            <Rect
              x={wordsAt - half}
              y={baseline - small}
              width={2 * half}
              height={small * 1.25}
              fill={colors.sheet}
            />
            <Line x1={from} x2={to} y1={y} y2={y} stroke={colors.text} strokeWidth={2} />
            <PictureText
              x={wordsAt}
              y={baseline}
              anchor="middle"
              size="small"
              textScale={textScale}
            >
              {words}
            </PictureText>
          </G>
        );
      })}
    </>
  );
}

function Ends({ width, textScale }: { width: number; textScale: number }) {
  const at = { y: 13 * textScale, size: 'small', color: 'textSoft', textScale } as const;
  return (
    <>
      <PictureText x={0} {...at}>
        headstock
      </PictureText>
      <PictureText x={width} anchor="end" {...at}>
        tailstock
      </PictureText>
    </>
  );
}

interface StrokeProps {
  ends: readonly Point[];
  color: string;
  strokeWidth: number;
  dash?: string;
}

function Stroke({ ends: [from, to], color, strokeWidth, dash }: StrokeProps) {
  if (!from || !to) return null;
  return (
    <Line
      x1={from.x}
      y1={from.y}
      x2={to.x}
      y2={to.y}
      stroke={color}
      strokeWidth={strokeWidth}
      strokeDasharray={dash}
    />
  );
}

interface CompoundProps {
  compound: NonNullable<SetupScene['compound']>;
  layout: SetupLayout;
  width: number;
  textScale: number;
}

/** The slide's travel with a mark at both ends of the surface, and its angle to the bed. */
function Compound({ compound, layout: { place }, width, textScale }: CompoundProps) {
  const [from, to] = compound.travel.map(place);
  if (!from || !to) return null;
  const words = `compound ${angleWords(compound.angleDeg)}`;
  const [start, end] = from.x < to.x ? [from, to] : [to, from];
  const fits = end.x + LABEL_GAP + wordsWidth(words, 'small', textScale) <= width;
  return (
    <>
      <Stroke
        ends={[from, { x: to.x, y: from.y }]}
        color={colors.outline}
        strokeWidth={1}
        dash={DOTS}
      />
      <Stroke ends={[from, to]} color={colors.mark} strokeWidth={3} />
      {compound.ends.map(place).map(({ x, y }) => (
        <Line key={x} x1={x} x2={x} y1={y - 6} y2={y + 6} stroke={colors.mark} strokeWidth={2} />
      ))}
      <PictureText
        x={fits ? end.x + LABEL_GAP : start.x - LABEL_GAP}
        y={Math.max(from.y, to.y)}
        anchor={fits ? 'start' : 'end'}
        size="small"
        textScale={textScale}
      >
        {words}
      </PictureText>
    </>
  );
}

/** A bent arrow across a turning part: the way its top goes. */
function TurnArrow({ ends: [from, to] }: { ends: readonly Point[] }) {
  if (!from || !to) return null;
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  if (!(length > 0)) return null;
  const along = { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
  // Bent towards the tailstock, whichever way it points.
  const side = along.y > 0 ? 1 : -1;
  const across = { x: along.y * side, y: -along.x * side };
  const bend = Math.min(length * 0.25, 9);
  const head = Math.min(length * 0.3, 8);
  const by = (start: Point, forward: number, sideways: number) =>
    `${start.x + along.x * forward + across.x * sideways},${start.y + along.y * forward + across.y * sideways}`;
  const curve = `M${by(from, 0, 0)}Q${by(from, length / 2, bend)} ${by(to, 0, 0)}`;
  const tip = `M${by(to, -head, -head * 0.4)}L${by(to, 0, 0)}L${by(to, -head * 0.7, head)}`;
  return (
    <>
      <Path
        d={curve + tip}
        fill="none"
        stroke={colors.page}
        strokeWidth={5}
        strokeLinecap="round"
      />
      <Path
        d={curve + tip}
        fill="none"
        stroke={colors.text}
        strokeWidth={2.2}
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </>
  );
}
