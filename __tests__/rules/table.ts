import {
  expectedWords,
  gotWords,
  judge,
  toleranceWords,
  type PublishedCase,
} from '@/shared/rules/published';
import { SOURCE_MARKS, SOURCES, type SourceId } from '@/shared/rules/sources';

interface Column {
  heading: string;
  width: number;
}

/** 120 characters with the spaces between them. */
const COLUMNS: readonly Column[] = [
  { heading: 'ok', width: 4 },
  { heading: 'what is checked', width: 31 },
  { heading: 'inputs', width: 28 },
  { heading: 'expected', width: 15 },
  { heading: 'got', width: 17 },
  { heading: 'tolerance', width: 15 },
];
const GAP = '  ';
const RULE = '-'.repeat(120);
const NOTE_INDENT = ' '.repeat(6);

/** Words broken into lines of a column; what is longer than the column is cut. */
function broken(text: string, width: number): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.replaceAll('\u00a0', ' ').split(' ')) {
    if (line !== '' && line.length + 1 + word.length > width) {
      lines.push(line);
      line = '';
    }
    line = line === '' ? word : `${line} ${word}`;
    while (line.length > width) {
      lines.push(line.slice(0, width));
      line = line.slice(width);
    }
  }
  return [...lines, line];
}

function row(texts: readonly string[]): string[] {
  const cells = COLUMNS.map(({ width }, index) => broken(texts[index] ?? '', width));
  const height = Math.max(...cells.map((lines) => lines.length));
  return Array.from({ length: height }, (_, at) =>
    COLUMNS.map(({ width }, index) => (cells[index]?.[at] ?? '').padEnd(width))
      .join(GAP)
      .trimEnd(),
  );
}

function caseLines(one: PublishedCase): string[] {
  const { got, ok } = judge(one);
  const checks = one.at === undefined ? one.checks : `${one.checks} [${one.at}]`;
  const note = one.note === undefined ? [] : broken(one.note, RULE.length - NOTE_INDENT.length);
  return [
    ...row([
      ok ? 'ok' : 'MISS',
      checks,
      one.inputs,
      expectedWords(one),
      gotWords(one, got),
      toleranceWords(one),
    ]),
    ...note.map((line) => NOTE_INDENT + line),
  ];
}

function sourceLines(source: SourceId, cases: readonly PublishedCase[]): string[] {
  const { title, place, edition, mark, note } = SOURCES[source];
  const words = [title, edition, place].filter(Boolean).join(', ');
  return [
    '',
    ...broken(`[${mark}] ${words} (${source})`, RULE.length),
    ...(note === undefined ? [] : broken(note, RULE.length)),
    RULE,
    ...cases.flatMap(caseLines),
  ];
}

const counted = (count: number, one: string, many = `${one}s`) =>
  `${count} ${count === 1 ? one : many}`;

/** Every case as a line of a table, by source, and the counts below; `missed` counts those that disagree. */
export function publishedTable(cases: readonly PublishedCase[]): { text: string; missed: number } {
  const sources = [...new Set(cases.map(({ source }) => source))].sort(byMark);
  const missed = cases.filter((one) => !judge(one).ok);
  const byEachMark = SOURCE_MARKS.flatMap((mark) => {
    const count = cases.filter(({ source }) => SOURCES[source].mark === mark).length;
    return count === 0 ? [] : [`${mark} ${count}`];
  });
  const lines = [
    ...row(COLUMNS.map(({ heading }) => heading)),
    ...sources.flatMap((id) =>
      sourceLines(
        id,
        cases.filter(({ source }) => source === id),
      ),
    ),
    '',
    ...missed.flatMap((one) => broken(`MISS ${one.source}: ${one.checks} (${one.inputs})`, 120)),
    `${counted(cases.length, 'case')} from ${counted(sources.length, 'source')}: ${byEachMark.join(', ')}`,
    `${cases.length - missed.length} agree, ${missed.length} failed`,
  ];
  return { text: lines.join('\n'), missed: missed.length };
}

function byMark(one: SourceId, other: SourceId): number {
  const rank = (id: SourceId) => SOURCE_MARKS.indexOf(SOURCES[id].mark);
  return rank(one) - rank(other);
}
