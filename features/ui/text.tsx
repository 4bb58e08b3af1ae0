import type { ReactNode } from 'react';
import { Text } from 'react-native';
import type { TextStyle } from 'react-native';

import { colors, type } from './tokens';
import type { ColorRole } from './tokens';

/** Colours that words may take; which ground each may stand on is tested in tokens.test.ts. */
export type TextTone = Extract<
  ColorRole,
  | 'text'
  | 'textSoft'
  | 'onEnamel'
  | 'onEnamelSoft'
  | 'onAccent'
  | 'onChosen'
  | 'onStop'
  | 'action'
  | 'accentText'
  | 'sparkText'
  | 'stop'
  | 'must'
  | 'fit'
>;

export interface TextProps {
  children: ReactNode;
  tone?: TextTone;
  /** Aligns numbers right in columns, or centres. */
  align?: 'left' | 'center' | 'right';
  /** Cuts after this many lines; leave out wherever words carry meaning. */
  lines?: number;
  /** Never breaks: for short words beside others. */
  whole?: boolean;
  /** Lets a line shrink or grow beside others. */
  flex?: number;
  /** For `aria-labelledby` and `aria-describedby`. */
  id?: string;
  /** Hides words that are spoken elsewhere. */
  hidden?: boolean;
  /** Crossed out: say in words beside it that it no longer counts. */
  struck?: boolean;
}

interface HeadingProps extends TextProps {
  /** Place in the page's outline. */
  level?: 1 | 2 | 3 | 4;
}

// A style of the web that React Native's types do not know.
const ON_ONE_LINE: object = { whiteSpace: 'nowrap' };

const STRUCK = { textDecorationLine: 'line-through' } as const;
// A role of the web that React Native's types do not know: what is crossed out is spoken as such.
const DELETED: object = { role: 'deletion' };

const textOf = (variant: TextStyle, defaultTone: TextTone) =>
  function Styled({
    children,
    tone = defaultTone,
    align,
    lines,
    whole,
    flex,
    id,
    hidden,
    struck = false,
  }: TextProps) {
    return (
      <Text
        id={id}
        aria-hidden={hidden}
        numberOfLines={lines}
        {...(struck ? DELETED : null)}
        style={[
          variant,
          { color: colors[tone], textAlign: align, flex },
          whole && ON_ONE_LINE,
          struck && STRUCK,
        ]}
      >
        {children}
      </Text>
    );
  };

const headingOf = (variant: TextStyle, defaultLevel: HeadingProps['level']) =>
  function Styled({
    children,
    tone = 'text',
    level = defaultLevel,
    align,
    lines,
    flex,
    id,
  }: HeadingProps) {
    return (
      <Text
        id={id}
        role="heading"
        aria-level={level}
        numberOfLines={lines}
        style={[variant, { color: colors[tone], textAlign: align, flex, margin: 0 }]}
      >
        {children}
      </Text>
    );
  };

/** The one large heading of a wide screen or of the signed-out page. */
export const Display = headingOf(type.display, 1);
/** The name of a screen. */
export const Title = headingOf(type.title, 1);
/** A section. */
export const Heading = headingOf(type.heading, 2);
/** A group inside a section. */
export const Subheading = headingOf(type.subheading, 3);
/** Running words. */
export const Body = textOf(type.body, 'text');
/** Running words that must be seen first. */
export const Strong = textOf(type.strong, 'text');
/** Words to be read slowly, at arm's length: cautions. */
export const Reading = textOf(type.reading, 'text');
/** Name of a field or figure. */
export const Label = textOf(type.label, 'text');
/** Remarks, sources, times. */
export const Small = textOf(type.small, 'textSoft');
/** Engraved capitals over a group of rows; not a heading. */
export const Engraved = textOf(type.engraved, 'textSoft');
/** A condensed name or numeral in a row: a belt step. */
export const NumeralSmall = textOf(type.readoutSmall, 'text');
/** At the running machine: 64 px. */
export const NumeralHuge = textOf(type.numeral, 'text');
