import { execFileSync } from 'node:child_process';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';

import { runMigrations } from '@/db/migrate';

import { openTestDatabase } from '../support/database';

const ROOT = path.resolve(__dirname, '../..');

describe('the migrations', () => {
  it('say all that the schema says', () => {
    const copy = fs.mkdtempSync(path.join(os.tmpdir(), 'ringtrue-migrations-'));
    try {
      fs.cpSync(path.join(ROOT, 'db/migrations'), copy, { recursive: true });
      const before = fs.readdirSync(copy);
      const options = ['--dialect', 'postgresql', '--schema', 'db/schema/index.ts', '--out'];
      execFileSync(
        process.execPath,
        ['node_modules/drizzle-kit/bin.cjs', 'generate', ...options, path.relative(ROOT, copy)],
        { cwd: ROOT, stdio: 'pipe' },
      );
      expect(fs.readdirSync(copy)).toEqual(before);
    } finally {
      fs.rmSync(copy, { recursive: true });
    }
  });

  it('run again without doing anything', async () => {
    const { urls, as, drop } = await openTestDatabase();
    const applied = async () =>
      (await as.owner.query('select hash, created_at from drizzle.__drizzle_migrations')).rows;
    const before = await applied();
    await runMigrations(urls.owner);
    expect(await applied()).toEqual(before);
    expect(before).toHaveLength(
      fs.readdirSync(path.join(ROOT, 'db/migrations')).filter((name) => name.endsWith('.sql'))
        .length,
    );
    await drop();
  });
});
