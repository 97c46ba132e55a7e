import { execFile } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import type { TestApp } from '../test-app';
import { as, type Person } from './people';

/** The words on a paper that somebody fetches. */
export async function readPaper(test: TestApp, person: Person, path: string): Promise<string> {
  const { body } = await as(test, person).get(path).responseType('blob').expect(200);
  return paperText(body as Buffer);
}

/** The words on a paper, as they stand in its lines. */
export async function paperText(content: Buffer): Promise<string> {
  const folder = await mkdtemp(join(tmpdir(), 'paper-'));
  try {
    const file = join(folder, 'paper.pdf');
    await writeFile(file, content);
    const { stdout } = await promisify(execFile)('pdftotext', ['-layout', file, '-']);
    return stdout;
  } finally {
    await rm(folder, { recursive: true });
  }
}
