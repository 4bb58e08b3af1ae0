import fs from 'node:fs';
import path from 'node:path';

import { paletteCss, palettes } from '@/features/ui/tokens';
import type { ColorRole, PaletteName } from '@/features/ui/tokens';

const root = path.resolve(__dirname, '../../..');

/** Source: WCAG 2.2, "relative luminance" and "contrast ratio". */
function luminance(hex: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5]
    .map((start) => parseInt(hex.slice(start, start + 2), 16) / 255)
    .map((share) => (share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4));
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function contrast(one: string, other: string): number {
  const [dark = 0, light = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b);
  return (light + 0.05) / (dark + 0.05);
}

const GROUNDS = ['page', 'well', 'sheet', 'field', 'hover'] as const;
const TINTS = ['stopTint', 'warnTint', 'mustTint', 'fitTint'] as const;
const ENAMEL = ['header', 'headerWell', 'nav'] as const;

/** Which words may stand on which ground. */
const WORDS: [ColorRole, readonly ColorRole[]][] = [
  ['text', [...GROUNDS, ...TINTS]],
  ['textSoft', [...GROUNDS, ...TINTS]],
  ['onEnamel', ENAMEL],
  ['onEnamelSoft', ENAMEL],
  ['onChosen', ['chosen']],
  ['action', ['page', 'sheet', 'field', 'hover']],
  ['onAccent', ['accent', 'accentPressed']],
  ['accentText', ['page', 'sheet']],
  ['sparkText', ['page', 'sheet', 'field']],
  ['stop', ['page', 'sheet', 'field', 'well', 'stopTint']],
  ['must', ['page', 'sheet', 'field', 'mustTint']],
  ['fit', ['page', 'sheet', 'field', 'fitTint']],
  ['onStop', ['stop', 'stopPressed']],
  ['onWarn', ['warn']],
  ['onMust', ['must']],
  ['onFit', ['fit']],
];

/** What must be seen without being read. */
const SHAPES: [ColorRole, readonly ColorRole[]][] = [
  ['outline', ['page', 'sheet', 'field']],
  ['mark', ['page', 'sheet', 'field']],
  ['markOnEnamel', ENAMEL],
  ['bar', ['page', 'sheet', 'field', 'well']],
  ['metal', ['page', 'sheet', 'well']],
  ['metalEdge', ['page', 'sheet', 'well']],
  ['spark', ['page', 'sheet', 'well']],
  ['stop', ['page', 'sheet', 'field', 'well']],
  ['fit', ['page', 'sheet', 'field']],
  ['must', ['page', 'sheet', 'field']],
];

const both = Object.keys(palettes) as PaletteName[];
const pairs = (table: [ColorRole, readonly ColorRole[]][]) =>
  both.flatMap((name) =>
    table.flatMap(([role, grounds]) => grounds.map((ground) => [name, role, ground] as const)),
  );

describe('contrast', () => {
  it('follows the definition', () => {
    expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 5);
    expect(contrast('#777777', '#FFFFFF')).toBeCloseTo(4.48, 2);
  });

  it.each(pairs(WORDS))('%s: %s reads on %s', (name, role, ground) => {
    expect(contrast(palettes[name][role], palettes[name][ground])).toBeGreaterThanOrEqual(4.5);
  });

  it.each(pairs(SHAPES))('%s: %s is seen on %s', (name, role, ground) => {
    expect(contrast(palettes[name][role], palettes[name][ground])).toBeGreaterThanOrEqual(3);
  });

  it.each(both)('%s: the focus ring or its halo is seen on every ground', (name) => {
    const palette = palettes[name];
    for (const ground of [...GROUNDS, ...TINTS, ...ENAMEL, 'chosen', 'accent', 'stop'] as const) {
      const ring = contrast(palette.focus, palette[ground]);
      const halo = contrast(palette.focusHalo, palette[ground]);
      expect(Math.max(ring, halo)).toBeGreaterThanOrEqual(3);
    }
    expect(contrast(palette.focus, palette.focusHalo)).toBeGreaterThanOrEqual(3);
  });

  it.each(both)('%s: the warning triangle is seen by its fill or its edge', (name) => {
    const palette = palettes[name];
    for (const ground of ['page', 'sheet', 'field', 'warnTint'] as const) {
      const fill = contrast(palette.warn, palette[ground]);
      const edge = contrast(palette.onWarn, palette[ground]);
      expect(Math.max(fill, edge)).toBeGreaterThanOrEqual(3);
    }
  });

  it('knows which paints may not be words on a light ground', () => {
    const { page, warn, accent, well, accentText } = palettes.day;
    expect(contrast(warn, page)).toBeLessThan(4.5);
    expect(contrast(accent, page)).toBeLessThan(4.5);
    expect(contrast('#FFFFFF', page)).toBeLessThan(4.5);
    expect(contrast(accentText, well)).toBeLessThan(4.5);
  });
});

describe('one place for colours', () => {
  const bare = (css: string) => css.replace(/\s|;(?=\})/g, '').toLowerCase();

  it('declares in the page exactly the palettes of the tokens', () => {
    const html = fs.readFileSync(path.join(root, 'public/index.html'), 'utf8');
    const style = /<style id="palettes">([\s\S]*?)<\/style>/.exec(html)?.[1] ?? '';
    expect(bare(style)).toBe(bare(paletteCss));
  });

  it('paints the browser’s own bar like the header', () => {
    const html = fs.readFileSync(path.join(root, 'public/index.html'), 'utf8');
    const bars = [...html.matchAll(/name="theme-color"[^>]*content="([^"]+)"/g)].map((m) => m[1]);
    expect(bars).toEqual([palettes.day.header, palettes.night.header]);
  });

  it('names no colour in any other file of the kit', () => {
    const folder = path.join(root, 'features/ui');
    const files = fs.readdirSync(folder).filter((file) => file !== 'tokens.ts');
    const named = files.filter((file) =>
      /#([0-9a-f]{3,4}){1,2}\b|rgba?\(/i.test(fs.readFileSync(path.join(folder, file), 'utf8')),
    );
    expect(files.length).toBeGreaterThan(20);
    expect(named).toEqual([]);
  });

  it('runs no script of the page’s own text', () => {
    const html = fs.readFileSync(path.join(root, 'public/index.html'), 'utf8');
    expect(html).not.toMatch(/<script(?![^>]*\ssrc=)/);
    expect(html).not.toMatch(/\son\w+=/);
  });
});
