import { execFile } from 'node:child_process';
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { promisify } from 'node:util';
import { expect, it } from '@jest/globals';
import { describeApi } from '../src/cli/describe-api';

const COMMITTED = resolve(__dirname, '../../web/src/lib/api-types.ts');
const GENERATOR = join(dirname(require.resolve('openapi-typescript/package.json')), 'bin/cli.js');

it("keeps the web's types in step with the routes (npm run api-types)", async () => {
  const folder = await mkdtemp(join(tmpdir(), 'api-types-'));
  try {
    const document = join(folder, 'openapi.json');
    const types = join(folder, 'api-types.ts');
    await writeFile(document, JSON.stringify(await describeApi()));
    await promisify(execFile)(process.execPath, [GENERATOR, document, '-o', types]);
    expect(await readFile(COMMITTED, 'utf8')).toBe(await readFile(types, 'utf8'));
  } finally {
    await rm(folder, { recursive: true });
  }
}, 60_000);
