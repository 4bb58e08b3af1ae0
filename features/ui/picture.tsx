import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { Text as SvgWords } from 'react-native-svg';

import { colors, fonts, pictureType, space } from './tokens';
import type { ColorRole } from './tokens';
import { Small } from './text';
import { useLayout, useMeasuredWidth } from './use-layout';

interface PictureProps {
  /** What it shows, in a sentence; the figures stand in words beside it. */
  description: string;
  /** Height of the drawing for the width and the text size it is given, in pixels. */
  height: (width: number, textScale: number) => number;
  /** Draws to the width it is given. */
  children: (size: { width: number; height: number; textScale: number }) => ReactNode;
  /** Words under the drawing: "Offset drawn 40 times too large". */
  caption?: string;
  /** Stops growing here. */
  maxWidth?: number;
}

/** The frame of a drawing: it measures its place, is read as one image, and never scrolls sideways. */
export function Picture({ description, height, children, caption, maxWidth }: PictureProps) {
  const [measured, onLayout] = useMeasuredWidth();
  const { textScale } = useLayout();
  const width = measured === null ? null : Math.min(measured, maxWidth ?? measured);
  const size = width === null ? null : { width, height: height(width, textScale), textScale };
  return (
    <View style={styles.frame}>
      <View onLayout={onLayout} style={{ minHeight: size?.height ?? 200 }}>
        {size !== null && size.width > 0 ? (
          <Svg
            role="img"
            aria-label={description}
            width={size.width}
            height={size.height}
            viewBox={`0 0 ${size.width} ${size.height}`}
          >
            {children(size)}
          </Svg>
        ) : null}
      </View>
      {caption ? <Small>{caption}</Small> : null}
    </View>
  );
}

interface PictureTextProps {
  x: number;
  y: number;
  children: string;
  anchor?: 'start' | 'middle' | 'end';
  color?: Extract<ColorRole, 'text' | 'textSoft' | 'sparkText' | 'stop' | 'action'>;
  size?: keyof typeof pictureType;
  strong?: boolean;
  textScale?: number;
}

/** Words in a drawing, in tabular figures. */
export function PictureText({
  x,
  y,
  children,
  anchor = 'start',
  color = 'text',
  size = 'body',
  strong = false,
  textScale = 1,
}: PictureTextProps) {
  const font = strong ? fonts.semibold : fonts.regular;
  return (
    <SvgWords
      x={x}
      y={y}
      textAnchor={anchor}
      fill={colors[color]}
      fontFamily={font.fontFamily}
      fontWeight={font.fontWeight}
      fontSize={pictureType[size] * textScale}
      {...TABULAR}
    >
      {children}
    </SvgWords>
  );
}

// SVG text takes styles on the web; its types do not say so.
const TABULAR: object = { style: { fontVariant: ['tabular-nums'] } };

const WIDEST_GLYPH = 0.56;

/** About how wide words will be, to keep labels apart and inside the drawing. */
export const wordsWidth = (words: string, size: keyof typeof pictureType, textScale = 1) =>
  words.length * pictureType[size] * textScale * WIDEST_GLYPH;

const styles = StyleSheet.create({
  frame: { gap: space[2], width: '100%' },
});
