const expo = require('jest-expo/jest-preset');

const transform = '<rootDir>/__tests__/support/transform.js';

// Packages that ship as ES modules only, which Jest cannot load as they are.
const MODULES = ['uuid', 'd3-', 'internmap', 'ml-levenberg-marquardt', 'is-any-array'].join('|');

const common = {
  moduleNameMapper: {
    '\\.(css|woff2?|png|svg)$': '<rootDir>/__tests__/support/asset.ts',
    '^@/(.*)$': '<rootDir>/$1',
  },
  modulePathIgnorePatterns: ['<rootDir>/.local', '<rootDir>/dist', '<rootDir>/.expo'],
};

const node = {
  ...common,
  testEnvironment: 'node',
  transform: { '\\.[cm]?[jt]sx?$': transform },
  transformIgnorePatterns: [`/node_modules/(?!(${MODULES}))`],
};

const screens = {
  ...common,
  transform: { '\\.mjs$': transform },
  transformIgnorePatterns: expo.transformIgnorePatterns.map((pattern) =>
    pattern.replace('(?!(', `(?!(${MODULES}|`),
  ),
};

/** @type {import('jest').Config} */
module.exports = {
  testTimeout: 30_000,
  projects: [
    {
      ...node,
      displayName: 'rules',
      testMatch: ['<rootDir>/__tests__/shared/**/*.test.ts'],
    },
    {
      ...node,
      displayName: 'boundaries',
      testMatch: ['<rootDir>/__tests__/boundaries/**/*.test.ts'],
    },
    {
      ...node,
      displayName: 'node',
      testMatch: ['<rootDir>/__tests__/{api,db}/**/*.test.ts'],
      globalSetup: '<rootDir>/__tests__/support/global-setup.ts',
      globalTeardown: '<rootDir>/__tests__/support/global-teardown.ts',
    },
    {
      ...screens,
      displayName: 'web',
      preset: 'jest-expo/web',
      testMatch: ['<rootDir>/__tests__/features/**/*.test.{ts,tsx}'],
      setupFilesAfterEnv: ['<rootDir>/__tests__/support/jest-dom.ts'],
    },
    {
      ...screens,
      displayName: 'native',
      preset: 'jest-expo/ios',
      testMatch: ['<rootDir>/__tests__/app/**/*.test.tsx'],
    },
    {
      ...node,
      displayName: 'browser',
      testMatch: ['<rootDir>/__tests__/e2e/**/*.e2e.ts'],
    },
  ],
};
