import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';
import { Test } from '@nestjs/testing';
import { settings } from '../../src/config/settings';
import { WorkVersion } from '../../src/jobs/work-version';
import { WorkerModule } from '../../src/worker.module';
import type { TestApp } from '../test-app';

/** For so long a block is a worker's in these tests. */
export const BLOCK_TIMEOUT_SECONDS = 3;

const SEARCHED = /part \d+ of search ([0-9a-f-]+) done, from choice (\d+)/g;
const COUNTED = /block (\d+) of study ([0-9a-f-]+) counted/g;

/** A worker in a process of its own, as `npm run worker` starts it. */
export class WorkerProcess {
  private readonly child: ChildProcess;
  private said = '';

  constructor(test: TestApp) {
    const words = ['-C', 'source', '-r', '@swc-node/register', 'src/worker.ts'];
    this.child = spawn(process.execPath, words, {
      cwd: join(__dirname, '../..'),
      stdio: ['ignore', 'pipe', 'pipe'],
      env: {
        ...process.env,
        DATABASE_URL: test.settings.databaseUrl,
        LOG_LEVEL: 'info',
        STUDY_BLOCK_TIMEOUT_SECONDS: String(BLOCK_TIMEOUT_SECONDS),
      },
    });
    for (const stream of [this.child.stdout, this.child.stderr]) {
      stream?.on('data', (chunk: Buffer) => (this.said += chunk.toString()));
    }
  }

  /** Blocks of a study that this process counted. */
  counted(studyId: string): number[] {
    return [...this.said.matchAll(COUNTED)]
      .filter(([, , id]) => id === studyId)
      .map(([, block]) => Number(block));
  }

  /** Choices that were known when this process took up each part of a search. */
  wentOnFrom(searchId: string): number[] {
    return [...this.said.matchAll(SEARCHED)]
      .filter(([, id]) => id === searchId)
      .map(([, , known]) => Number(known));
  }

  get words(): string {
    return this.said;
  }

  /** Stops it between two instructions; `SIGCONT` lets it go on. */
  signal(signal: NodeJS.Signals): void {
    this.child.kill(signal);
  }

  /** Ends it as the signal does and answers how it ended. */
  async end(signal: NodeJS.Signals): Promise<{ code: number | null; signal: NodeJS.Signals | null }> {
    const { child } = this;
    if (child.exitCode === null && child.signalCode === null) {
      child.kill(signal);
      await once(child, 'exit');
    }
    return { code: child.exitCode, signal: child.signalCode };
  }
}

/** A worker of another version of the programme, in this process. */
export async function startWorkerOf(own: string, test: TestApp): Promise<{ close(): Promise<void> }> {
  const module = await Test.createTestingModule({ imports: [WorkerModule] })
    .overrideProvider(settings.KEY)
    .useValue(test.settings)
    .overrideProvider(WorkVersion)
    .useValue({ own })
    .compile();
  module.useLogger(false);
  return module.init();
}
