import { spawnSync } from 'node:child_process';
import fs from 'node:fs';
import path from 'node:path';

const PROJECT = path.resolve(__dirname, '../..');
const CONFIGURATION = [
  'package.json',
  'tsconfig.json',
  'eslint.config.js',
  '.dependency-cruiser.cjs',
];

/** Files by path, as text. */
export type Files = Record<string, string>;

/**
 * A small project under the real one, so that it finds the real packages, with the real configuration.
 */
export class Tree {
  private readonly root: string;

  constructor(files: Files) {
    const local = path.join(PROJECT, '.local');
    fs.mkdirSync(local, { recursive: true });
    this.root = fs.mkdtempSync(path.join(local, 'planted-'));
    for (const name of CONFIGURATION) fs.copyFileSync(path.join(PROJECT, name), this.at(name));
    for (const [name, text] of Object.entries(files)) {
      fs.mkdirSync(path.dirname(this.at(name)), { recursive: true });
      fs.writeFileSync(this.at(name), text);
    }
  }

  /** Runs one of the project's tools here and parses what it says. */
  run(tool: string, args: string[]): unknown {
    const program = path.join(PROJECT, 'node_modules/.bin', tool);
    const { stdout, stderr } = spawnSync(program, args, {
      cwd: this.root,
      encoding: 'utf8',
      maxBuffer: 2 ** 28,
    });
    if (!stdout.startsWith('{') && !stdout.startsWith('[')) throw new Error(stderr || stdout);
    return JSON.parse(stdout);
  }

  folders() {
    return fs
      .readdirSync(this.root, { withFileTypes: true })
      .filter((entry) => entry.isDirectory())
      .map((entry) => entry.name);
  }

  relative(file: string) {
    return path.relative(this.root, file);
  }

  remove() {
    fs.rmSync(this.root, { recursive: true, force: true });
  }

  private at(name: string) {
    return path.join(this.root, name);
  }
}
