import { StyleSheet } from 'react-native';
import type { TextStyle } from 'react-native';

/**
 * The one file that names colours and sizes. Colours are CSS variables, declared for both palettes in
 * public/index.html, so that the right palette stands before the first script runs.
 */
const paint = {
  ink: '#1B211E',
  inkSoft: '#4B5550',
  enamel9: '#1D2C27',
  enamel7: '#2F4A42',
  enamel5: '#4F7064',
  enamel2: '#C3D1CA',
  enamel1: '#E1E9E4',
  dial: '#F7F2E6',
  plate: '#EFE7D6',
  line: '#D6CBB4',
  paper: '#FCFAF4',
  white: '#FFFFFF',
  brass: '#8A6720',
  brassBright: '#C7A050',
} as const;

const day = {
  /** Words and numerals on page, well, sheet, field and every tint. */
  text: paint.ink,
  textSoft: paint.inkSoft,
  /** Grounds: the page, a sunken well, a raised sheet, the inside of a field. */
  page: paint.dial,
  well: paint.plate,
  sheet: paint.paper,
  field: paint.white,
  /** A hairline between rows; never the only border of a control. */
  rule: paint.line,
  /** Borders of controls. */
  outline: paint.inkSoft,
  /** Header enamel, the pressed-in place on it, and what stands on both. */
  header: paint.enamel7,
  headerWell: '#263C35',
  nav: paint.enamel9,
  onEnamel: paint.paper,
  onEnamelSoft: paint.enamel2,
  enamelRule: paint.enamel5,
  /** A chosen segment, chip or jaw. */
  chosen: paint.enamel7,
  onChosen: paint.paper,
  /** Text and outline of secondary actions. */
  action: paint.enamel7,
  hover: paint.enamel1,
  /** The one main action on a screen. */
  accent: paint.brassBright,
  accentPressed: '#B48E40',
  onAccent: paint.ink,
  accentEdge: paint.brass,
  /** Index mark on page, sheet and field; on enamel use markOnEnamel. */
  mark: paint.brass,
  markOnEnamel: paint.brassBright,
  /** Brass as words: page and sheet only. */
  accentText: paint.brass,
  /** Drawn metal and its outline; bars that break no limit. */
  metal: paint.enamel5,
  metalEdge: paint.ink,
  bar: paint.enamel7,
  /** Contact and metal in pictures, and the words for it. */
  spark: '#D9501A',
  sparkText: '#B5420F',
  /** ISO 3864: verdicts and cautions only, with a word and a shape. */
  stop: '#9B2423',
  onStop: paint.white,
  stopPressed: '#7D1B1A',
  stopTint: '#FBE9E8',
  warn: '#F9A800',
  onWarn: paint.ink,
  warnTint: '#FFF4DC',
  must: '#005387',
  onMust: paint.white,
  mustTint: '#E4EEF5',
  fit: '#1F7A4C',
  onFit: paint.white,
  fitTint: '#E6F2EA',
  /** Two-tone focus ring: seen on every ground. */
  focus: paint.ink,
  focusHalo: paint.white,
  /** Behind an open sheet. */
  scrim: 'rgba(27, 33, 30, 0.55)',
} as const;

export type ColorRole = keyof typeof day;

const night: Record<ColorRole, string> = {
  text: paint.dial,
  textSoft: paint.enamel2,
  page: paint.enamel9,
  well: '#17231F',
  sheet: '#253831',
  field: '#131D1A',
  rule: '#40564D',
  outline: '#8FA59B',
  header: paint.enamel7,
  headerWell: '#22362F',
  nav: '#131D1A',
  onEnamel: paint.paper,
  onEnamelSoft: paint.enamel2,
  enamelRule: paint.enamel5,
  chosen: paint.enamel2,
  onChosen: paint.ink,
  action: paint.enamel1,
  hover: '#2D433B',
  accent: paint.brassBright,
  accentPressed: '#B48E40',
  onAccent: paint.ink,
  accentEdge: paint.brassBright,
  mark: paint.brassBright,
  markOnEnamel: paint.brassBright,
  accentText: paint.brassBright,
  metal: '#8BAA9D',
  metalEdge: paint.dial,
  bar: '#A9C2B7',
  spark: '#FF8A4C',
  sparkText: '#FF8A4C',
  stop: '#FF8A80',
  onStop: paint.ink,
  stopPressed: '#FFA69E',
  stopTint: '#3B2523',
  warn: '#F9A800',
  onWarn: paint.ink,
  warnTint: '#393017',
  must: '#7FB8F0',
  onMust: paint.ink,
  mustTint: '#1B3040',
  fit: '#6CCB98',
  onFit: paint.ink,
  fitTint: '#1A382A',
  focus: paint.dial,
  focusHalo: paint.ink,
  scrim: 'rgba(8, 12, 11, 0.7)',
};

/** Black on white, whatever the screen's palette. */
const printed: Partial<Record<ColorRole, string>> = {
  page: paint.white,
  sheet: paint.white,
  header: paint.white,
  headerWell: paint.white,
  nav: paint.white,
  onEnamel: paint.ink,
  onEnamelSoft: paint.inkSoft,
};

export type PaletteName = 'day' | 'night';
export const palettes: Record<PaletteName, Record<ColorRole, string>> = { day, night };

const ROLES = Object.keys(day) as ColorRole[]; // Object.keys forgets the key type
const variable = (role: ColorRole) =>
  `--${role.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`)}`;

/** `colors.text` is the CSS variable of that role in whichever palette is on. */
export const colors = Object.fromEntries(
  ROLES.map((role) => [role, `var(${variable(role)})`]),
) as Record<ColorRole, string>; // fromEntries forgets the key type

const declare = (palette: Partial<Record<ColorRole, string>>) =>
  ROLES.flatMap((role) => (palette[role] ? [`${variable(role)}:${palette[role]}`] : [])).join(';');

/**
 * The style text of public/index.html that declares both palettes; a test holds the two together.
 *
 * @internal
 */
export const paletteCss = [
  `:root{color-scheme:light;${declare(day)}}`,
  `@media (prefers-color-scheme:dark){:root:not([data-palette=day]){color-scheme:dark;${declare(night)}}}`,
  `:root[data-palette=night]{color-scheme:dark;${declare(night)}}`,
  `@media print{:root:root:root{color-scheme:light;${declare({ ...day, ...printed })}}}`,
].join('\n');

/** Multiples of 4 px. */
export const space = {
  1: 4,
  2: 8,
  3: 12,
  4: 16,
  5: 20,
  6: 24,
  8: 32,
  10: 40,
  12: 48,
  16: 64,
} as const;

export const radius = { control: 6, pill: 999 } as const;
/** Smallest height and width of anything that is pressed; at the running machine, and hairlines. */
export const target = { base: 48, machine: 64 } as const;
export const stroke = { hairline: 1, control: 1.5, heavy: 2, index: 4 } as const;
/** The rail and two panes begin here; nothing scrolls sideways at the least width. */
export const breakpoint = { wide: 900, least: 320 } as const;
export const measure = { form: 480, text: 640, page: 1440, rail: 96 } as const;

const FALLBACK = 'Barlow Fallback, Roboto, Arial, sans-serif';
const CONDENSED_FALLBACK = 'Barlow Condensed Fallback, Arial Narrow, Arial, sans-serif';

/** One family per weight, as expo-font names them; the weight serves the fallback. */
export const fonts = {
  regular: { fontFamily: `Barlow-Regular, ${FALLBACK}`, fontWeight: '400' },
  medium: { fontFamily: `Barlow-Medium, ${FALLBACK}`, fontWeight: '500' },
  semibold: { fontFamily: `Barlow-SemiBold, ${FALLBACK}`, fontWeight: '600' },
  condensed: { fontFamily: `BarlowCondensed-SemiBold, ${CONDENSED_FALLBACK}`, fontWeight: '600' },
} as const satisfies Record<string, TextStyle>;

// Sizes are in rem so that text follows the reader's own size; React Native's types know pixels only.
const rem = (pixels: number) => `${pixels / 16}rem` as unknown as number;
const tabular = { fontVariant: ['tabular-nums'] } satisfies TextStyle;
const style = (font: TextStyle, size: number, line: number): TextStyle => ({
  ...font,
  ...tabular,
  fontSize: rem(size),
  lineHeight: rem(line),
});

/** The type scale. */
export const type = StyleSheet.create({
  small: style(fonts.regular, 14, 20),
  body: style(fonts.regular, 16, 24),
  strong: style(fonts.semibold, 16, 24),
  label: style(fonts.medium, 15, 20),
  reading: style(fonts.regular, 18, 27),
  value: style(fonts.regular, 18, 24),
  button: style(fonts.semibold, 17, 22),
  buttonLarge: style(fonts.semibold, 24, 30),
  engraved: { ...style(fonts.condensed, 14, 20), letterSpacing: 1, textTransform: 'uppercase' },
  subheading: style(fonts.condensed, 18, 24),
  heading: style(fonts.condensed, 21, 28),
  title: style(fonts.condensed, 24, 28),
  display: style(fonts.condensed, 32, 40),
  readoutSmall: style(fonts.condensed, 20, 26),
  readout: style(fonts.condensed, 26, 32),
  readoutLarge: style(fonts.condensed, 36, 44),
  numeral: style(fonts.condensed, 64, 68),
});

/** Sizes of text in pictures, in pixels before the reader's scale. */
export const pictureType = { small: 13, body: 14 } as const;
