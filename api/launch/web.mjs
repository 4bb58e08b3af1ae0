import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';

import { ROOT, say } from './launcher.mjs';

const SOURCES = [
  ...['app', 'features', 'shared', 'assets', 'public'],
  ...['app.json', 'babel.config.js', 'metro.config.js', 'tsconfig.json', 'package-lock.json'],
];

/**
 * Builds the web app into a folder below the project, unless it was built from the same sources.
 *
 * @param {string} folder - relative to the project
 */
export async function buildWeb(launcher, folder) {
  const output = path.join(ROOT, folder);
  // Dot files are never served.
  const mark = path.join(output, '.sources');
  const sources = hashOf(SOURCES);
  if (fs.existsSync(mark) && fs.readFileSync(mark, 'utf8') === sources) return;
  say('Building the screens: two minutes or so the first time');
  fs.rmSync(output, { recursive: true, force: true });
  const expo = path.join(ROOT, 'node_modules/.bin/expo');
  await launcher.run([expo, 'export', '--platform', 'web', '--output-dir', folder], {
    name: 'web-build',
    trouble: 'The screens could not be built.',
    env: { CI: '1', EXPO_OFFLINE: '1', EXPO_NO_TELEMETRY: '1', NODE_ENV: 'production' },
  });
  fs.writeFileSync(mark, sources);
}

function hashOf(names) {
  const hash = createHash('sha256');
  for (const name of names.flatMap(filesBelow)) {
    hash
      .update(`${name}\0`)
      .update(fs.readFileSync(path.join(ROOT, name)))
      .update('\0');
  }
  return hash.digest('hex');
}

function filesBelow(name) {
  const stat = fs.statSync(path.join(ROOT, name), { throwIfNoEntry: false });
  if (!stat) return [];
  if (!stat.isDirectory()) return [name];
  const inside = fs.readdirSync(path.join(ROOT, name)).sort();
  return inside.flatMap((entry) => filesBelow(path.join(name, entry)));
}
