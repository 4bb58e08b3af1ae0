/** What holds for the published cases as a whole. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

import * as ts from 'typescript';

import {
  allowance,
  isNumberCheck,
  judge,
  PUBLISHED,
  type PublishedCase,
} from '@/shared/rules/published';
import { SOURCES } from '@/shared/rules/sources';

const FOLDER = join(__dirname, '../../../../shared/rules/published');
const NOT_CASES = ['index.ts', 'types.ts', 'case.ts', 'wheel.ts'];
const names = readdirSync(FOLDER).filter((name) => !NOT_CASES.includes(name));

const files = names.map((name) => {
  const path = join(FOLDER, name);
  const exported = jest.requireActual<Record<string, PublishedCase[]>>(path);
  return { name, path, cases: Object.values(exported).flat() };
});

/** Numbers and words that stand in a file as they are, fractions of two numbers included. */
function literalsOf(path: string): Set<number | string> {
  const found = new Set<number | string>();
  const visit = (node: ts.Node) => {
    if (ts.isNumericLiteral(node)) found.add(Number(node.text));
    if (ts.isStringLiteralLike(node)) found.add(node.text);
    if (
      ts.isBinaryExpression(node) &&
      node.operatorToken.kind === ts.SyntaxKind.SlashToken &&
      ts.isNumericLiteral(node.left) &&
      ts.isNumericLiteral(node.right)
    )
      found.add(Number(node.left.text) / Number(node.right.text));
    ts.forEachChild(node, visit);
  };
  visit(ts.createSourceFile(path, readFileSync(path, 'utf8'), ts.ScriptTarget.Latest, true));
  return found;
}

const nameOf = ({ source, checks, inputs }: PublishedCase) => `${source}: ${checks}, ${inputs}`;

describe('the published cases', () => {
  it('are all of the cases of all of the files, each once', () => {
    const all = files.flatMap(({ cases }) => cases);
    expect(PUBLISHED.map(nameOf).sort()).toEqual(all.map(nameOf).sort());
    expect(new Set(all.map(nameOf)).size).toBe(all.length);
  });

  it('have a test file of their name', () => {
    const tests = readdirSync(__dirname).map((name) => name.replace('.test.ts', '.ts'));
    expect(names.filter((name) => !tests.includes(name))).toEqual([]);
  });

  it('are more than two hundred, from more than thirty sources, and all of them agree', () => {
    expect(PUBLISHED.filter((one) => !judge(one).ok).map(nameOf)).toEqual([]);
    expect(PUBLISHED.length).toBeGreaterThan(200);
    expect(new Set(PUBLISHED.map(({ source }) => source)).size).toBeGreaterThan(30);
  });

  it('name sources of the registry, with a mark that is not the shop’s own word', () => {
    for (const { source } of PUBLISHED) {
      expect(Object.keys(SOURCES)).toContain(source);
      expect(SOURCES[source].mark).not.toBe('entered');
    }
  });

  it.each(files)('state what they expect in $name as a literal', ({ path, cases }) => {
    const literals = literalsOf(path);
    expect(cases.filter(({ expected }) => !literals.has(expected)).map(nameOf)).toEqual([]);
  });

  it('would miss an expectation that is off by three tolerances, either way, or another word', () => {
    const shifted = PUBLISHED.flatMap((one): PublishedCase[] =>
      isNumberCheck(one)
        ? [3, -3].map((times) => ({
            ...one,
            expected: one.expected + times * allowance(one),
            tolerance: { within: allowance(one) },
          }))
        : [{ ...one, expected: `${one.expected} not` }],
    );
    expect(shifted.filter((one) => judge(one).ok).map(nameOf)).toEqual([]);
  });
});
