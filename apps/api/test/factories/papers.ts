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

/** A word on a paper and where it stands, in points from the upper left. */
export interface PlacedWord {
  page: number;
  text: string;
  xMin: number;
  yMin: number;
  xMax: number;
  yMax: number;
}

/** Every word of a paper with its place. */
export async function paperWords(content: Buffer): Promise<PlacedWord[]> {
  const pages = (await readPdf(content, '-bbox')).split('<page ').slice(1);
  return pages.flatMap((text, n) =>
    [...text.matchAll(/<word xMin="(.+?)" yMin="(.+?)" xMax="(.+?)" yMax="(.+?)">(.*?)<\/word>/g)].map(
      ([, xMin, yMin, xMax, yMax, word = '']): PlacedWord => ({
        page: n + 1,
        text: word,
        xMin: Number(xMin),
        yMin: Number(yMin),
        xMax: Number(xMax),
        yMax: Number(yMax),
      }),
    ),
  );
}

/** The words on a paper, as they stand in its lines. */
export const paperText = (content: Buffer): Promise<string> => readPdf(content, '-layout');

async function readPdf(content: Buffer, how: '-layout' | '-bbox'): Promise<string> {
  const folder = await mkdtemp(join(tmpdir(), 'paper-'));
  try {
    const file = join(folder, 'paper.pdf');
    await writeFile(file, content);
    const { stdout } = await promisify(execFile)('pdftotext', [how, file, '-']);
    return stdout;
  } finally {
    await rm(folder, { recursive: true });
  }
}
