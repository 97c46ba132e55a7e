import { extname, join } from 'node:path';
import { Worker } from 'node:worker_threads';
import { Injectable, type OnModuleDestroy } from '@nestjs/common';
import type { SpecPackData } from './spec-pack';

/** One order to be drawn. */
export interface PressTask {
  id: number;
  data: SpecPackData;
}

/** Its paper, or what went wrong. */
export type PressAnswer = { id: number; pdf: Uint8Array } | { id: number; fault: string };

interface Waiting {
  resolve: (pdf: Buffer) => void;
  reject: (fault: Error) => void;
}

/** From source, as in tests and while developing, the thread reads TypeScript as this process does. */
const EXTENSION = extname(__filename);
const FROM_SOURCE = ['-C', 'source', '-r', '@swc-node/register'];

/**
 * Draws the papers of orders in a thread of its own, one after the other, so that no request waits for another's drawing.
 * The thread starts with the first order and ends with the process.
 */
@Injectable()
export class SpecPress implements OnModuleDestroy {
  private thread: Worker | null = null;
  private readonly waiting = new Map<number, Waiting>();
  private lastId = 0;

  draw(data: SpecPackData): Promise<Buffer> {
    const id = (this.lastId += 1);
    const thread = (this.thread ??= this.start());
    thread.ref();
    return new Promise((resolve, reject) => {
      this.waiting.set(id, { resolve, reject });
      thread.postMessage({ id, data } satisfies PressTask);
    });
  }

  async onModuleDestroy(): Promise<void> {
    await this.thread?.terminate();
  }

  private start(): Worker {
    const thread = new Worker(join(__dirname, `spec-thread${EXTENSION}`), {
      ...(EXTENSION === '.ts' && { execArgv: FROM_SOURCE }),
    });
    thread.on('message', (answer: PressAnswer) => {
      const waiting = this.waiting.get(answer.id);
      this.waiting.delete(answer.id);
      // Idle, it keeps no process alive.
      if (this.waiting.size === 0) thread.unref();
      if ('pdf' in answer) waiting?.resolve(Buffer.from(answer.pdf));
      else waiting?.reject(new Error(`an order was not drawn: ${answer.fault}`));
    });
    const lost = (fault: Error) => {
      if (this.thread === thread) this.thread = null;
      for (const { reject } of this.waiting.values()) reject(fault);
      this.waiting.clear();
    };
    thread.on('error', lost);
    thread.on('exit', () => lost(new Error('the drawing thread ended')));
    return thread;
  }
}
