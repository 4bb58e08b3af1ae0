import fs from 'node:fs';
import path from 'node:path';
import { parseArgs } from 'node:util';

import { openDatabase } from '../api/launch/database.mjs';
import { launch, LOCAL, ROOT, say } from '../api/launch/launcher.mjs';
import { installPackages } from '../api/launch/packages.mjs';
import { startServer } from '../api/launch/server.mjs';
import { buildWeb } from '../api/launch/web.mjs';
import { freePort } from '../db/local/cluster.mjs';
import { installPackage, programOnPath } from '../db/local/debian.mjs';
import { Trouble } from '../db/local/trouble.mjs';

const WEB_ROOT = '.local/test-web';

/** Each part answers with its counts; a part that is one command counts as one test. */
const PARTS = {
  types: (launcher) => script(launcher, 'types'),
  lint: (launcher) => script(launcher, 'lint'),
  boundaries: async (launcher, patterns) => [
    await script(launcher, 'boundaries'),
    await jest(launcher, { projects: ['boundaries'], patterns }),
  ],
  unused: (launcher) => script(launcher, 'unused'),
  rules: (launcher, patterns) => jest(launcher, { projects: ['rules'], patterns }),
  api: (launcher, patterns) => jest(launcher, { projects: ['node'], patterns }),
  screens: (launcher, patterns) => jest(launcher, { projects: ['web', 'native'], patterns }),
  browser,
};

launch(async (launcher) => {
  const { parts, patterns } = readArguments();
  await installPackages(launcher);
  if (parts.includes('browser')) requireChromium();
  const results = [];
  for (const part of parts) {
    say(`\n== ${part}`);
    const started = Date.now();
    const { passed, failed } = sum([await PARTS[part](launcher, patterns)].flat());
    launcher.goOn();
    const seconds = Math.round((Date.now() - started) / 1000);
    say(`-- ${part}: ${passed} passed, ${failed} failed, ${seconds} s`);
    results.push({ part, passed, failed });
  }
  const { passed, failed } = sum(results);
  const red = results.filter((result) => result.failed > 0).map(({ part }) => part);
  if (red.length > 0) say(`\nLook at: ${red.join(', ')}`);
  say(`\n${passed} passed, ${failed} failed`);
  return failed > 0 ? 1 : 0;
});

function readArguments() {
  const { values, positionals } = parseArgs({
    options: { only: { type: 'string' } },
    allowPositionals: true,
  });
  const parts = values.only?.split(',') ?? Object.keys(PARTS);
  const unknown = parts.filter((part) => !(part in PARTS));
  if (unknown.length > 0) {
    throw new Trouble(
      `There is no part "${unknown.join(', ')}". The parts are: ${Object.keys(PARTS).join(', ')}.`,
    );
  }
  return { parts, patterns: positionals };
}

function sum(results) {
  return results.reduce(
    (total, { passed, failed }) => ({
      passed: total.passed + passed,
      failed: total.failed + failed,
    }),
    { passed: 0, failed: 0 },
  );
}

async function script(launcher, name) {
  const code = await launcher.start(['npm', 'run', '--silent', name]).ended;
  return { passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1 };
}

async function jest(launcher, { projects, patterns = [], options = [], env }) {
  const report = path.join(LOCAL, 'logs', `jest-${projects.join('-')}.json`);
  fs.mkdirSync(path.dirname(report), { recursive: true });
  fs.rmSync(report, { force: true });
  const program = [process.execPath, path.join(ROOT, 'node_modules/jest/bin/jest.js')];
  const output = ['--json', '--outputFile', report];
  const { ended } = launcher.start(
    [...program, '--selectProjects', ...projects, ...options, ...output, '--', ...patterns],
    // Reports go to stderr while the JSON is written; both belong to one stream of words here.
    { env, stdio: ['ignore', 1, 1] },
  );
  const code = await ended;
  if (!fs.existsSync(report)) return { passed: 0, failed: 1 };
  const { numPassedTests, numFailedTests, numRuntimeErrorTestSuites } = JSON.parse(
    fs.readFileSync(report, 'utf8'),
  );
  const failed = numFailedTests + numRuntimeErrorTestSuites;
  // A run that found no test, or failed in its teardown, has failed as well.
  return { passed: numPassedTests, failed: failed || (code === 0 && numPassedTests > 0 ? 0 : 1) };
}

async function browser(launcher, patterns) {
  const { env, signIns } = await openDatabase(launcher, 'test');
  await buildWeb(launcher, WEB_ROOT);
  const log = fs.openSync(path.join(LOCAL, 'logs/browser-server.log'), 'w');
  const server = await startServer(launcher, {
    port: await freePort(),
    env: { ...env, WEB_ROOT },
    stdio: ['ignore', log, log],
  });
  const result = await jest(launcher, {
    projects: ['browser'],
    patterns,
    // A browser and a server keep two cores busy; two browsers would wait for each other.
    options: ['--runInBand'],
    env: { BASE_URL: server.address, SIGN_INS: JSON.stringify(signIns) },
  });
  await server.stop();
  return result;
}

function requireChromium() {
  const named = process.env.CHROMIUM;
  if (named ? !fs.existsSync(named) : !programOnPath('chromium')) {
    installPackage('chromium', 'The browser part', say);
  }
}
