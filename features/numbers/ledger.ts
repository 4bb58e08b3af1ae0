import {
  expectedWords,
  gotWords,
  judge,
  PUBLISHED,
  toleranceWords,
  type PublishedCase,
} from '@/shared/rules/published';
import { restsOn, type Resting } from '@/shared/rules/rests-on';
import {
  SOURCE_MARKS,
  SOURCES,
  type Source,
  type SourceId,
  type SourceMark,
} from '@/shared/rules/sources';

/** A published case as it came out on this device, in words. */
export interface Check {
  key: string;
  checks: string;
  inputs: string;
  at: string | null;
  note: string | null;
  expected: string;
  got: string;
  tolerance: string;
  ok: boolean;
}

export interface SourceEntry {
  id: SourceId;
  source: Source;
  checks: Check[];
  resting: Resting;
}

export interface MarkGroup {
  mark: SourceMark;
  entries: SourceEntry[];
}

function carriedOut(one: PublishedCase, index: number): Check {
  const { got, ok } = judge(one);
  return {
    key: `${one.source}-${index}`,
    checks: one.checks,
    inputs: one.inputs,
    at: one.at ?? null,
    note: one.note ?? null,
    expected: expectedWords(one),
    got: gotWords(one, got),
    tolerance: toleranceWords(one),
    ok,
  };
}

/** Every source of the registry, with what is checked against it and what rests on it. */
export function openLedger(cases: readonly PublishedCase[] = PUBLISHED): SourceEntry[] {
  const ids = Object.keys(SOURCES) as SourceId[]; // Object.keys forgets the key type
  return ids.map((id) => ({
    id,
    source: SOURCES[id],
    checks: cases.filter(({ source }) => source === id).map(carriedOut),
    resting: restsOn(id),
  }));
}

/** The entries by mark, most trusted first, those with checks before those without; marks without any are left out. */
export function byMark(entries: readonly SourceEntry[]): MarkGroup[] {
  return SOURCE_MARKS.map((mark) => ({
    mark,
    entries: entries
      .filter(({ source }) => source.mark === mark)
      .sort((one, other) => Number(other.checks.length > 0) - Number(one.checks.length > 0)),
  })).filter((group) => group.entries.length > 0);
}

const plain = (text: string) => text.toLowerCase().replaceAll('\u00a0', ' ');

/**
 * The entries that hold every word searched for: whole where the source itself does, else with the checks that do.
 */
export function searched(entries: readonly SourceEntry[], search: string): SourceEntry[] {
  const wanted = plain(search).split(/\s+/).filter(Boolean);
  if (wanted.length === 0) return [...entries];
  const holds = (texts: readonly (string | null | undefined)[]) => {
    const text = plain(texts.filter(Boolean).join(' '));
    return wanted.every((word) => text.includes(word));
  };
  return entries.flatMap((entry) => {
    const { title, place, edition, mark, note } = entry.source;
    const own = [title, place, edition, mark, note];
    const { figures, findings, cautions, settings } = entry.resting;
    if (holds([...own, ...figures, ...findings, ...cautions, ...settings.map((s) => s.label)]))
      return [entry];
    const checks = entry.checks.filter((check) =>
      holds([...own, check.checks, check.inputs, check.at, check.expected]),
    );
    return checks.length > 0 ? [{ ...entry, checks }] : [];
  });
}

export interface Tally {
  checks: number;
  sources: number;
  missed: number;
}

export function tally(entries: readonly SourceEntry[]): Tally {
  const checks = entries.flatMap((entry) => entry.checks);
  return {
    checks: checks.length,
    sources: entries.filter((entry) => entry.checks.length > 0).length,
    missed: checks.filter(({ ok }) => !ok).length,
  };
}
