import { type AddressInfo } from 'node:net';
import { setTimeout as wait } from 'node:timers/promises';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { type ParsedMail, simpleParser } from 'mailparser';
import { SMTPServer, type SMTPServerOptions } from 'smtp-server';
import { OutboxAttachment } from '../src/mail/entities/outbox-attachment.entity';
import { OutboxMail } from '../src/mail/entities/outbox-mail.entity';
import { MailService } from '../src/mail/mail.service';
import { OutboxWorker } from '../src/mail/outbox-worker';
import { ApiProcess, freePort } from './factories/stand-ins';
import { startTestApp, type TestApp } from './test-app';

type Answer = Error | 'break-the-line' | 'say-nothing' | null;

/** A mail server on this machine that answers as it is told. */
class FakeMailServer {
  readonly received: ParsedMail[] = [];
  answers: Answer[] = [];
  private readonly server: SMTPServer;

  constructor() {
    const onData: SMTPServerOptions['onData'] = (stream, session, done) => {
      simpleParser(stream)
        .then((mail) => {
          const answer = this.answers.shift() ?? null;
          if (!(answer instanceof Error)) this.received.push(mail);
          if (answer === 'break-the-line') this.breakLine(session.id);
          else if (answer !== 'say-nothing') done(answer ?? undefined);
        })
        .catch(done);
    };
    this.server = new SMTPServer({ authOptional: true, disabledCommands: ['STARTTLS', 'AUTH'], onData });
  }

  async start(): Promise<string> {
    await new Promise<void>((resolve) => this.server.listen(0, '127.0.0.1', resolve));
    return `smtp://127.0.0.1:${(this.server.server.address() as AddressInfo).port}`;
  }

  async stop(): Promise<void> {
    await new Promise<void>((resolve) => this.server.close(resolve));
  }

  private breakLine(sessionId: string): void {
    for (const connection of this.server.connections) {
      const one = connection as unknown as { id: string; _socket: { destroy(): void } };
      if (one.id === sessionId) one._socket.destroy();
    }
  }
}

const refusal = (code: number) => Object.assign(new Error('refused'), { responseCode: code });

let server: FakeMailServer;
let test: TestApp;
let worker: OutboxWorker;
beforeAll(async () => {
  server = new FakeMailServer();
  test = await startTestApp({ smtpUrl: await server.start(), mailFrom: 'Shop <shop@settlewright.test>' });
  worker = test.app.get(OutboxWorker);
});
afterAll(async () => {
  await test.close();
  await server.stop();
});
beforeEach(() => {
  server.received.length = 0;
  server.answers = [];
});
afterEach(() => test.dataSource.query('DELETE FROM outbox_mails'));

const MAIL = { to: 'upholsterer@cushions.test', subject: 'Order 7', text: 'Eleven cushions', kind: 'order' };

const enqueue = (more: Partial<Parameters<MailService['enqueue']>[1]> = {}) =>
  test.dataSource.transaction((manager) => test.app.get(MailService).enqueue(manager, { ...MAIL, ...more }));
async function until(isSo: () => boolean): Promise<void> {
  const patience = Date.now() + 10_000;
  while (!isSo() && Date.now() < patience) await wait(20);
  expect(isSo()).toBe(true);
}
const read = (id: string) => test.dataSource.manager.findOneByOrFail(OutboxMail, { id });
const makeDue = () => test.dataSource.query(`UPDATE outbox_mails SET next_attempt_at = now()`);

describe('a mail in the outbox', () => {
  it('goes out with its text, attachment and Message-ID, and keeps no content afterwards', async () => {
    const content = Buffer.from('%PDF-1.4 not really');
    const queued = await enqueue({
      html: '<p>Eleven cushions</p>',
      replyTo: 'lead@shop.test',
      attachments: [{ filename: 'order-7.pdf', contentType: 'application/pdf', content }],
    });
    expect(await worker.sendDue()).toBe(1);
    const [mail] = server.received;
    expect(mail).toMatchObject({ subject: 'Order 7', messageId: queued.messageId });
    expect(mail?.from?.text).toContain('shop@settlewright.test');
    expect(mail?.replyTo?.text).toBe('lead@shop.test');
    expect(mail?.text).toContain('Eleven cushions');
    expect(mail?.attachments[0]).toMatchObject({ filename: 'order-7.pdf', contentType: 'application/pdf' });
    expect(mail?.attachments[0]?.content.equals(content)).toBe(true);
    const sent = await read(queued.id);
    expect(sent).toMatchObject({ state: 'sent', text: null, html: null, attempts: 1 });
    expect(sent.sentAt?.getTime()).toBeGreaterThanOrEqual(sent.queuedAt.getTime());
    expect(await test.dataSource.manager.countBy(OutboxAttachment, { mailId: queued.id })).toBe(0);
    expect(await worker.sendDue()).toBe(0);
  });

  it('is not sent when its event is rolled back', async () => {
    const undone = test.dataSource.transaction(async (manager) => {
      await test.app.get(MailService).enqueue(manager, MAIL);
      throw new Error('the order could not be saved');
    });
    await expect(undone).rejects.toThrow('could not be saved');
    expect(await worker.sendDue()).toBe(0);
  });

  it('is sent once by several processes', async () => {
    for (let number = 0; number < 12; number += 1) await enqueue({ subject: `Order ${number}` });
    const others = [worker, worker, worker].map((one) => one.sendDue());
    const counts = await Promise.all(others);
    expect(counts.reduce((sum, count) => sum + count, 0)).toBe(12);
    const subjects = server.received.map((mail) => mail.subject);
    expect(new Set(subjects).size).toBe(12);
    expect(subjects).toHaveLength(12);
  });

  it('waits longer after each passing refusal, then goes out with the same Message-ID', async () => {
    const queued = await enqueue();
    server.answers = [refusal(451), refusal(451), null];
    await worker.sendDue();
    const first = await read(queued.id);
    expect(first).toMatchObject({ state: 'queued', attempts: 1 });
    expect(first.lastFault).toContain('refused');
    expect(await worker.sendDue()).toBe(0);
    await makeDue();
    await worker.sendDue();
    const second = await read(queued.id);
    const waitOf = (mail: OutboxMail) => mail.nextAttemptAt.getTime() - (mail.sendingAt?.getTime() ?? 0);
    expect(Math.round(waitOf(second) / 10_000)).toBe(6);
    await makeDue();
    await worker.sendDue();
    expect((await read(queued.id)).state).toBe('sent');
    expect(server.received.map((mail) => mail.messageId)).toEqual([queued.messageId]);
  });

  it('fails after eight passing refusals, or at once after a lasting one', async () => {
    const queued = await enqueue();
    server.answers = Array.from({ length: 8 }, () => refusal(451));
    for (let attempt = 0; attempt < 8; attempt += 1) {
      await makeDue();
      await worker.sendDue();
    }
    expect(await read(queued.id)).toMatchObject({ state: 'failed', attempts: 8 });
    const lasting = await enqueue();
    server.answers = [refusal(550)];
    await worker.sendDue();
    const failed = await read(lasting.id);
    expect(failed).toMatchObject({ state: 'failed', attempts: 1, text: MAIL.text });
    expect(failed.failedAt).not.toBeNull();
  });

  it('is perhaps sent when the line breaks without an answer, and not sent again by itself', async () => {
    const queued = await enqueue();
    server.answers = ['break-the-line'];
    await worker.sendDue();
    expect((await read(queued.id)).state).toBe('perhaps-sent');
    await makeDue();
    expect(await worker.sendDue()).toBe(0);
    expect(server.received).toHaveLength(1);
  });

  it('is perhaps sent when the process ended while sending, and goes out again when a person says so', async () => {
    const queued = await enqueue();
    await test.dataSource.query(
      `UPDATE outbox_mails SET state = 'sending', sending_at = now() - interval '11 minutes'`,
    );
    expect(await worker.sendDue()).toBe(0);
    expect((await read(queued.id)).state).toBe('perhaps-sent');
    const mails = test.app.get(MailService);
    expect(await mails.sendAgain(test.dataSource.manager, queued.id)).toBe(true);
    expect(await worker.sendDue()).toBe(1);
    expect(server.received[0]?.messageId).toBe(queued.messageId);
    expect(await mails.sendAgain(test.dataSource.manager, queued.id)).toBe(false);
  });

  it('is never sent twice by itself when the process is killed after handing it over', async () => {
    server.answers = ['say-nothing'];
    const api = await ApiProcess.start(test.settings, await freePort());
    const queued = await enqueue();
    await until(() => server.received.length > 0);
    await api.kill();
    expect(await read(queued.id)).toMatchObject({ state: 'sending', attempts: 1, text: MAIL.text });
    expect(await worker.sendDue()).toBe(0);
    // The clock alone is moved: after ten minutes whoever held it has ended.
    await test.dataSource.query(`UPDATE outbox_mails SET sending_at = sending_at - interval '11 minutes'`);
    expect(await worker.sendDue()).toBe(0);
    expect(await read(queued.id)).toMatchObject({ state: 'perhaps-sent', text: MAIL.text });
    expect(server.received.map(({ messageId }) => messageId)).toEqual([queued.messageId]);
  });

  it('is left alone while another process is sending it', async () => {
    const queued = await enqueue();
    await test.dataSource.query(`UPDATE outbox_mails SET state = 'sending', sending_at = now()`);
    expect(await worker.sendDue()).toBe(0);
    expect((await read(queued.id)).state).toBe('sending');
  });

  it('waits for a server that cannot be reached', async () => {
    const away = await startTestApp({ smtpUrl: 'smtp://127.0.0.1:1' }, '_away');
    const queued = await away.app.get(MailService).enqueue(away.dataSource.manager, MAIL);
    await away.app.get(OutboxWorker).sendDue();
    const tried = await away.dataSource.manager.findOneByOrFail(OutboxMail, { id: queued.id });
    expect(tried).toMatchObject({ state: 'queued', attempts: 1 });
    await away.close();
  });
});

it('sends without being asked while the application runs, and stops with it', async () => {
  const running = await startTestApp({ smtpUrl: test.settings.smtpUrl, mailPollMs: 20 }, '_running');
  await running.app.get(MailService).enqueue(running.dataSource.manager, MAIL);
  await until(() => server.received.length > 0);
  await running.close();
});
