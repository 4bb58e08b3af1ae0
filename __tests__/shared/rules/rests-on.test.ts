import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

import { PUBLISHED } from '@/shared/rules/published';
import { restsOn } from '@/shared/rules/rests-on';
import { SOURCES, type SourceId } from '@/shared/rules/sources';

const FOLDER = join(__dirname, '../../../shared/rules');
const CATALOGUES = /^(sources|rests-on|findings.*|cautions.*)\.ts$/;
const rules = readdirSync(FOLDER)
  .filter((name) => name.endsWith('.ts') && !CATALOGUES.test(name))
  .map((name) => readFileSync(join(FOLDER, name), 'utf8'))
  // Docstrings name sources too, but no reader meets those.
  .map((text) => text.replace(/\/\*\*[\s\S]*?\*\//g, ''))
  .join('\n');

const ids = Object.keys(SOURCES) as SourceId[];

it.each(ids.filter((id) => rules.includes(`'${id}'`)))(
  'the working of some figure or a setting names %s, and it is said which',
  (id) => {
    const { figures, settings } = restsOn(id);
    expect([...figures, ...settings]).not.toEqual([]);
  },
);

it('no figure is said to rest on a source that the rules do not name', () => {
  const cited = new Set(
    readdirSync(FOLDER)
      .filter((name) => name !== 'sources.ts' && name !== 'rests-on.ts' && name.endsWith('.ts'))
      .flatMap((name) => [
        ...readFileSync(join(FOLDER, name), 'utf8').matchAll(/[a-z0-9]+(?:-[a-z0-9]+)*/g),
      ])
      .map(([word]) => word),
  );
  expect(ids.filter((id) => restsOn(id).figures.length > 0 && !cited.has(id))).toEqual([]);
});

it('a value recalled from memory is a shop setting, a figure, a finding or a published case', () => {
  const bare = ids.filter((id) => {
    const { figures, findings, cautions, settings } = restsOn(id);
    const resting = figures.length + findings.length + cautions.length + settings.length;
    return (
      SOURCES[id].mark === 'memory' &&
      resting === 0 &&
      !PUBLISHED.some(({ source }) => source === id)
    );
  });
  // Constants inside figures whose own source is another, and a law that asks for no number.
  const known: SourceId[] = [
    'osha-1910-215-d2',
    'memory-quill-material',
    'memory-wheel-density',
    'memory-mandrel-grip',
  ];
  expect(bare.filter((id) => !known.includes(id))).toEqual([]);
});
