const tanstackQuery = require('@tanstack/eslint-plugin-query');
const { defineConfig, globalIgnores } = require('eslint/config');
const expo = require('eslint-config-expo/flat');
const jsdoc = require('eslint-plugin-jsdoc');

const TYPESCRIPT = ['**/*.{ts,tsx}'];
const PURE = ['shared/{units,domain,rules,roles}/**/*.ts'];
const OUTSIDE_UI = {
  files: ['app/**/*.{ts,tsx}', 'features/**/*.{ts,tsx}'],
  ignores: ['features/ui/**'],
};

/** Who may not import whom, as the author types; .dependency-cruiser.cjs judges the same and more. */
const zones = [
  { target: './shared', from: ['./app', './features', './api', './db', './__tests__'] },
  { target: './features', from: ['./app', './api', './db', './__tests__'] },
  { target: './app', from: ['./api', './db', './shared', './__tests__'] },
  { target: './api', from: ['./app', './features', './__tests__'] },
  { target: './db', from: ['./app', './features', './api', './__tests__'] },
];

const everywhere = {
  rules: {
    'import/no-restricted-paths': ['error', { zones }],
    'import/no-default-export': 'error',
    // The compiler judges these already, and faster.
    'import/namespace': 'off',
    'import/default': 'off',
    'import/no-named-as-default': 'off',
    'import/no-named-as-default-member': 'off',
    'max-params': ['error', 3],
    'max-lines': ['error', { max: 250, skipBlankLines: true, skipComments: true }],
    eqeqeq: 'error',
    'no-param-reassign': 'error',
  },
};

const typescript = {
  files: TYPESCRIPT,
  languageOptions: { parserOptions: { projectService: true } },
  rules: {
    '@typescript-eslint/no-explicit-any': 'error',
    '@typescript-eslint/no-non-null-assertion': 'error',
    '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
    '@typescript-eslint/no-floating-promises': 'error',
    '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: false }],
    '@typescript-eslint/switch-exhaustiveness-check': [
      'error',
      { considerDefaultExhaustiveForUnions: true },
    ],
  },
};

const routes = {
  files: ['app/**/*.tsx'],
  rules: { 'import/no-default-export': 'off' },
};

const thinRoutes = {
  files: ['app/**/*.tsx'],
  ignores: ['app/**/_layout.tsx', 'app/+html.tsx'],
  rules: { 'max-lines': ['error', { max: 25, skipBlankLines: true, skipComments: true }] },
};

const primitivesOnly = {
  ...OUTSIDE_UI,
  rules: {
    'no-restricted-imports': [
      'error',
      {
        paths: [
          {
            name: 'react-native',
            importNames: [
              'Text',
              'TextInput',
              'Pressable',
              'Button',
              'Switch',
              'TouchableOpacity',
              'TouchableHighlight',
              'TouchableWithoutFeedback',
            ],
            message: 'Take the primitive from features/ui.',
          },
        ],
      },
    ],
    'no-restricted-syntax': [
      'error',
      ...['Literal[value=%]', 'TemplateElement[value.raw=%]'].map((selector) => ({
        selector: selector.replace('%', String(/#([0-9a-f]{3,4}){1,2}\b/i)),
        message: 'Take the colour from the tokens of features/ui.',
      })),
    ],
  },
};

const oneDoorToTheServer = {
  files: ['app/**/*.{ts,tsx}', 'features/**/*.{ts,tsx}'],
  ignores: ['features/transport/**'],
  rules: {
    'no-restricted-globals': [
      'error',
      { name: 'fetch', message: 'Ask through features/transport, which parses the answer.' },
    ],
  },
};

const queries = {
  files: ['features/**/*.{ts,tsx}'],
  extends: [tanstackQuery.configs['flat/recommended']],
  rules: { '@tanstack/query/prefer-query-options': 'error' },
};

const pure = {
  files: PURE,
  rules: {
    // A formula takes as many arguments as it has symbols.
    'max-params': ['error', 6],
    'no-restricted-globals': [
      'error',
      ...['fetch', 'window', 'document', 'navigator', 'localStorage', 'process', 'console'],
      ...['setTimeout', 'setInterval', 'performance', 'crypto', 'Intl'],
    ],
    'no-restricted-properties': [
      'error',
      { object: 'Date', property: 'now', message: 'The time arrives as an argument.' },
      { object: 'Math', property: 'random', message: 'Chance arrives as an argument.' },
      { property: 'toLocaleString', message: 'The locale is not the core’s business.' },
    ],
    'no-restricted-syntax': [
      'error',
      {
        selector: 'NewExpression[callee.name="Date"][arguments.length=0]',
        message: 'The time arrives as an argument.',
      },
      {
        selector:
          'Program > VariableDeclaration[kind="let"], Program > ExportNamedDeclaration > VariableDeclaration[kind="let"]',
        message: 'A rule holds no state.',
      },
    ],
  },
};

const EXPORTED = ['ExportNamedDeclaration > FunctionDeclaration'];

const documented = {
  files: PURE,
  plugins: { jsdoc },
  settings: { jsdoc: { mode: 'typescript' } },
  rules: {
    'jsdoc/require-jsdoc': ['error', { publicOnly: true }],
    'jsdoc/require-description': ['error', { contexts: EXPORTED }],
    'jsdoc/require-param': ['error', { contexts: EXPORTED, checkDestructured: false }],
    'jsdoc/require-param-description': ['error', { contexts: EXPORTED }],
    'jsdoc/check-param-names': ['error', { checkDestructured: false }],
    'jsdoc/require-returns': ['error', { contexts: EXPORTED }],
    'jsdoc/no-types': 'error',
    'jsdoc/check-tag-names': ['error', { definedTags: ['source'] }],
  },
};

const fonts = {
  files: ['features/ui/**'],
  rules: { '@typescript-eslint/no-require-imports': ['error', { allow: ['\\.woff2$'] }] },
};

const tests = {
  files: ['__tests__/**'],
  rules: { 'max-params': 'off' },
};

const nodeGlobals = [
  ...['process', 'Buffer', 'URL', 'AbortController', 'AbortSignal', 'fetch', '__dirname'],
  ...['setTimeout', 'clearTimeout', 'setInterval', 'clearInterval', 'setImmediate'],
];

const plainNode = {
  files: ['**/*.{js,cjs,mjs}'],
  languageOptions: { globals: Object.fromEntries(nodeGlobals.map((name) => [name, 'readonly'])) },
};

const defaultExportsThatToolsAskFor = {
  files: [
    '*.config.{js,ts}',
    '**/*.d.ts',
    '__tests__/support/{asset,global-setup,global-teardown}.ts',
  ],
  rules: { 'import/no-default-export': 'off' },
};

module.exports = defineConfig([
  globalIgnores([
    'dist',
    'build',
    '.expo',
    '.local',
    'public',
    'expo-env.d.ts',
    '__tests__/e2e/out',
  ]),
  { linterOptions: { reportUnusedDisableDirectives: 'error' } },
  expo,
  everywhere,
  typescript,
  routes,
  thinRoutes,
  primitivesOnly,
  oneDoorToTheServer,
  queries,
  pure,
  documented,
  fonts,
  tests,
  plainNode,
  defaultExportsThatToolsAskFor,
]);
