import { Tree, type Files } from './tree';

const lines = (count: number, line: (index: number) => string) =>
  Array.from({ length: count }, (_, index) => line(index)).join('\n');

/** What a rule is to refuse: the file it is planted in, and its text. */
const PLANTED: Record<string, { file: string; text: string; rule: string }> = {
  'a rule that reads the clock': {
    file: 'shared/rules/clock.ts',
    text: 'const started = Date.now();\nexport { started };',
    rule: 'no-restricted-properties',
  },
  'a rule that asks what day it is': {
    file: 'shared/rules/today.ts',
    text: 'const today = new Date();\nexport { today };',
    rule: 'no-restricted-syntax',
  },
  'a rule that throws dice': {
    file: 'shared/rules/dice.ts',
    text: 'const chance = Math.random();\nexport { chance };',
    rule: 'no-restricted-properties',
  },
  'a rule that remembers': {
    file: 'shared/rules/memory.ts',
    text: 'let calls = 0;\ncalls += 1;\nconst count = calls;\nexport { count };',
    rule: 'no-restricted-syntax',
  },
  'a rule that reads the environment': {
    file: 'shared/rules/environment.ts',
    text: 'const secret = process.env.SECRET;\nexport { secret };',
    rule: 'no-restricted-globals',
  },
  'a rule without a docstring': {
    file: 'shared/rules/bare.ts',
    text: 'export function bare(depthMm: number) {\n  return depthMm;\n}',
    rule: 'jsdoc/require-jsdoc',
  },
  'a rule that leaves a parameter unexplained': {
    file: 'shared/rules/unexplained.ts',
    text: '/** Halves. @returns mm */\nexport function half(depthMm: number) {\n  return depthMm / 2;\n}',
    rule: 'jsdoc/require-param',
  },
  'a misspelt tag': {
    file: 'shared/rules/tag.ts',
    text: '/**\n * Ten.\n *\n * @retrns mm\n */\nexport const ten = () => 10;',
    rule: 'jsdoc/check-tag-names',
  },
  'shared code that imports the database': {
    file: 'shared/rules/stored.ts',
    text: "import { client } from '@/db/client';\n\nexport { client };",
    rule: 'import/no-restricted-paths',
  },
  'raw text on a screen': {
    file: 'features/wheels/raw.tsx',
    text: "import { Text } from 'react-native';\n\nexport const Raw = () => <Text>A</Text>;",
    rule: 'no-restricted-imports',
  },
  'a raw press in a route': {
    file: 'app/_layout.tsx',
    text: "import { Pressable } from 'react-native';\n\nexport default Pressable;",
    rule: 'no-restricted-imports',
  },
  'a colour outside the tokens': {
    file: 'features/wheels/colour.ts',
    text: "export const colour = '#a1b2c3';",
    rule: 'no-restricted-syntax',
  },
  'a request past the transport': {
    file: 'features/wheels/asked.ts',
    text: "export const asked = () => fetch('/api/wheels');",
    rule: 'no-restricted-globals',
  },
  'a query written where it is used': {
    file: 'features/wheels/inline.ts',
    text: "import { useQuery } from '@tanstack/react-query';\n\nexport const useWheels = () => useQuery({ queryKey: ['wheels'], queryFn: () => 1 });",
    rule: '@tanstack/query/prefer-query-options',
  },
  'a query key that lacks what it depends on': {
    file: 'features/wheels/keys.ts',
    text: "import { queryOptions } from '@tanstack/react-query';\n\nexport const wheel = (id: string) =>\n  queryOptions({ queryKey: ['wheel'], queryFn: () => id });",
    rule: '@tanstack/query/exhaustive-deps',
  },
  'a route that does the work itself': {
    file: 'app/long.tsx',
    text: `export default function Long() {\n${lines(25, (n) => `  void ${n};`)}\n  return null;\n}`,
    rule: 'max-lines',
  },
  'a file that has grown': {
    file: 'api/grown.ts',
    text: lines(251, (n) => `export const n${n} = ${n};`),
    rule: 'max-lines',
  },
  'a default export': {
    file: 'api/default.ts',
    text: 'const nothing = 0;\nexport default nothing;',
    rule: 'import/no-default-export',
  },
  'four parameters': {
    file: 'api/four.ts',
    text: 'export const four = (a: number, b: number, c: number, d: number) => a + b + c + d;',
    rule: 'max-params',
  },
  any: {
    file: 'api/any.ts',
    text: 'export const read = (body: any) => body as string;',
    rule: '@typescript-eslint/no-explicit-any',
  },
  'a promise that nothing is there': {
    file: 'api/bang.ts',
    text: 'export const first = (names: string[]) => names[0]!;',
    rule: '@typescript-eslint/no-non-null-assertion',
  },
  'a value import of a type': {
    file: 'api/types.ts',
    text: "import { Request } from 'express';\n\nexport type Asked = Request;",
    rule: '@typescript-eslint/consistent-type-imports',
  },
  'a promise nobody waits for': {
    file: 'api/floating.ts',
    text: 'export function start(work: () => Promise<void>) {\n  work();\n}',
    rule: '@typescript-eslint/no-floating-promises',
  },
  'a switch that forgets a case': {
    file: 'api/switch.ts',
    text: "export function word(verdict: 'clear' | 'stop') {\n  switch (verdict) {\n    case 'clear':\n      return 1;\n  }\n  return 0;\n}",
    rule: '@typescript-eslint/switch-exhaustiveness-check',
  },
};

/** What stands beside it and is allowed. */
const CLEAN: Files = {
  'db/client.ts': 'export const client = 1;',
  'app/index.tsx': 'export default function Home() {\n  return null;\n}',
  'features/ui/text.tsx': "import { Text } from 'react-native';\n\nexport { Text };",
  'features/ui/tokens.ts': "export const steel = '#a1b2c3';",
  'features/transport/ask.ts': "export const ask = () => fetch('/api/wheels');",
  'shared/rules/half.ts': `/**
 * Half of a depth.
 *
 * @param depthMm - mm, any
 * @returns mm, unrounded
 * @source derived
 * @example half(1) // 0.5
 */
export function half(depthMm: number) {
  return depthMm / 2;
}`,
};

interface Answer {
  filePath: string;
  messages: { ruleId: string | null }[];
}

function complaints(files: Files): Record<string, (string | null)[]> {
  const tree = new Tree(files);
  try {
    const answer = tree.run('eslint', [...tree.folders(), '--format', 'json']) as Answer[];
    return Object.fromEntries(
      answer.map(({ filePath, messages }) => [
        tree.relative(filePath),
        messages.map(({ ruleId }) => ruleId),
      ]),
    );
  } finally {
    tree.remove();
  }
}

describe('the habits ESLint keeps', () => {
  const planted = Object.fromEntries(Object.values(PLANTED).map(({ file, text }) => [file, text]));
  const found = complaints({ ...CLEAN, ...planted });

  test.each(Object.keys(CLEAN))('%s is clean', (file) => {
    expect(found[file]).toEqual([]);
  });

  test.each(Object.entries(PLANTED))('%s is refused', (_, { file, rule }) => {
    expect(found[file]).toContain(rule);
  });
});
