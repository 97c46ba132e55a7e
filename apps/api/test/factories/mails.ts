import { OutboxMail } from '../../src/mail/entities/outbox-mail.entity';
import type { TestApp } from '../test-app';

/** The newest queued mail of a kind to an address. */
export async function findMail(test: TestApp, to: string, kind: string): Promise<OutboxMail | null> {
  return test.dataSource.manager.findOne(OutboxMail, { where: { to, kind }, order: { queuedAt: 'DESC' } });
}

/** The token at the end of the one link in that mail. */
export async function mailedToken(test: TestApp, to: string, kind: string): Promise<string> {
  const mail = await findMail(test, to, kind);
  const token = mail?.text?.match(/https?:\/\/\S+\/([\w-]{40,})/)?.[1];
  if (!token) throw new Error(`no mail of kind ${kind} with a link was queued for ${to}`);
  return token;
}
