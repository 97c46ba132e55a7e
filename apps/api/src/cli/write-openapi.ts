import 'reflect-metadata';
import { mkdir, writeFile } from 'node:fs/promises';
import { dirname } from 'node:path';
import { describeApi } from './describe-api';

/** write-openapi <path>: writes the OpenAPI document; neither a database nor a port is needed. */
async function main(path: string | undefined): Promise<void> {
  if (!path) throw new Error('Usage: write-openapi <path>');
  await mkdir(dirname(path), { recursive: true });
  await writeFile(path, `${JSON.stringify(await describeApi(), null, 2)}\n`);
}

main(process.argv[2]).catch((fault: unknown) => {
  console.error(fault);
  process.exitCode = 1;
});
