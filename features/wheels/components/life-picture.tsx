import { Line, Rect } from 'react-native-svg';

import { dayWords } from '@/features/records';
import { useShop } from '@/features/session';
import { Stack } from '@/features/ui/card';
import { Fold } from '@/features/ui/fold';
import { Picture, PictureText, wordsWidth } from '@/features/ui/picture';
import { Table } from '@/features/ui/table';
import { Heading, Small } from '@/features/ui/text';
import { colors } from '@/features/ui/tokens';
import type { WheelEntryView, WheelLife } from '@/shared/contracts/wheel-entries';
import { unitLabel } from '@/shared/units/entry-units';
import { formatQuantity } from '@/shared/units/format';

import { entryWords } from '../entry-words';
import { leftWords } from '../left';
import { labelAt, lifeBar, lifeMarks, lossesOf, type LifeMark, type Loss } from '../life-geometry';

const BAR = { top: 34, height: 30, over: 8 };
const LINE = 22;

interface LifePictureProps {
  life: WheelLife;
  /** Those that are fetched, newest first. */
  entries: readonly WheelEntryView[];
}

/** What was there, what is left, and the dressings between: a bar of the wheel's diameters. */
export function LifePicture({ life, entries }: LifePictureProps) {
  const { units } = useShop();
  const { wheel, standing } = life;
  const sizes = wheel.data;
  const marks = lifeMarks(entries, sizes.diameterNowMm);
  const size = (value: number) => formatQuantity({ value, unit: 'mm' }, units);
  const losses = lossesOf(sizes.diameterNewMm, marks);
  const taken = lossWords(losses, standing.dressings, size);
  const left = leftWords(sizes);
  const isKnown = sizes.smallestUsableMm !== null;
  const description = [
    `New ${size(sizes.diameterNewMm)}, now ${size(sizes.diameterNowMm)}`,
    sizes.smallestUsableMm === null
      ? `smallest usable diameter not recorded, hole ${size(sizes.holeMm)}`
      : `smallest usable ${size(sizes.smallestUsableMm)}, ${left} left`,
    taken,
  ].join('; ');
  return (
    <Stack gap={2}>
      <Heading>{isKnown ? `How much is left: ${left}` : 'How much is left'}</Heading>
      <Picture
        description={description}
        height={(_, scale) => BAR.top * scale + BAR.height + BAR.over + 2 * LINE * scale}
        caption={
          isKnown
            ? `${taken}.`
            : `${taken}. The smallest usable diameter is not recorded; without it only the hole is the end.`
        }
      >
        {({ width, textScale }) => {
          const bar = lifeBar(sizes, marks, width);
          const top = BAR.top * textScale;
          const foot = top + BAR.height;
          const label = (words: string, at: number, strong = false) => ({
            ...labelAt(words, at, { width, wordWidth: wordsWidth(words, 'body', textScale) }),
            strong,
          });
          const now = label(`${size(sizes.diameterNowMm)} now`, bar.now, true);
          const end = label(`${size(bar.endMm)} ${bar.endIs}`, bar.end);
          return (
            <>
              <Rect x={0} y={top} width={bar.end} height={BAR.height} fill={colors.metal} />
              <Rect
                x={bar.end}
                y={top}
                width={Math.max(bar.now - bar.end, 0)}
                height={BAR.height}
                fill={colors.bar}
              />
              <Rect
                x={bar.now}
                y={top}
                width={Math.max(bar.fresh - bar.now, 0)}
                height={BAR.height}
                fill={colors.well}
              />
              {bar.dressed.map(({ x, width: lost }, index) => (
                <Rect
                  key={index}
                  x={x}
                  y={top}
                  width={lost}
                  height={BAR.height}
                  fill={colors.metalEdge}
                  stroke={colors.page}
                  strokeWidth={0.5}
                />
              ))}
              <Rect
                x={0.5}
                y={top + 0.5}
                width={width - 1}
                height={BAR.height - 1}
                fill="none"
                stroke={colors.outline}
              />
              {[bar.end, bar.now].map((x, index) => (
                <Line
                  key={index}
                  x1={x}
                  x2={x}
                  y1={top - BAR.over}
                  y2={foot + BAR.over}
                  stroke={colors.text}
                  strokeWidth={2}
                />
              ))}
              <PictureText
                x={width}
                y={top - 14}
                anchor="end"
                color="textSoft"
                textScale={textScale}
              >
                {`${size(sizes.diameterNewMm)} new`}
              </PictureText>
              <PictureText
                x={now.x}
                y={foot + BAR.over + LINE * textScale * 0.8}
                anchor={now.anchor}
                strong
                textScale={textScale}
              >
                {now.words}
              </PictureText>
              <PictureText
                x={end.x}
                y={foot + BAR.over + LINE * textScale * 1.7}
                anchor={end.anchor}
                color="textSoft"
                textScale={textScale}
              >
                {end.words}
              </PictureText>
            </>
          );
        }}
      </Picture>
      {marks.length > 0 ? <Sizes marks={marks} life={life} entries={entries} /> : null}
    </Stack>
  );
}

/** "2 dressings took 0.4 mm off, drawn as dark strips; use and wear 17.1 mm" */
function lossWords(
  losses: readonly Loss[],
  dressings: number,
  size: (value: number) => string,
): string {
  const dressed = losses.filter(({ byDressing }) => byDressing);
  const sum = (some: readonly Loss[]) =>
    some.reduce((total, { fromMm, toMm }) => total + fromMm - toMm, 0);
  const worn = sum(losses) - sum(dressed);
  const rest = worn > 0 ? `; use and wear took ${size(worn)}` : '';
  if (dressings === 0) return `Not dressed yet${rest}`;
  const count = dressings === 1 ? '1 dressing' : `${dressings} dressings`;
  if (dressed.length < dressings)
    return `${count}, the last ${dressed.length} of them drawn as dark strips`;
  return `${count} took ${size(sum(dressed))} off, drawn as dark strips${rest}`;
}

function Sizes({ marks, life, entries }: LifePictureProps & { marks: readonly LifeMark[] }) {
  const { units } = useShop();
  const reader = { units, spindles: life.spindles, entries };
  return (
    <Fold label="Every size on record" value={String(marks.length)}>
      <Table
        caption="Sizes of the wheel, the newest first"
        rows={[...marks].reverse()}
        rowKey={({ entry }) => entry.id}
        dense
        columns={[
          { id: 'on', label: 'On', cell: ({ entry }) => dayWords(entry.happenedOn) },
          { id: 'what', label: 'What', cell: ({ entry }) => entryWords(entry.step, reader) },
          {
            id: 'size',
            label: `Diameter, ${unitLabel('mm', units)}`,
            numeric: true,
            cell: ({ diameterMm }) =>
              formatQuantity({ value: diameterMm, unit: 'mm' }, units, { withUnit: false }),
          },
        ]}
      />
      <Small>Found from what was measured, and twice the depth of each dressing pass.</Small>
    </Fold>
  );
}
