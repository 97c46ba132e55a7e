import { Injectable, type OnModuleDestroy } from '@nestjs/common';
import { createTransport, type SendMailOptions, type Transporter } from 'nodemailer';
import { InjectSettings, type Settings } from '../config/settings';

/** How a hand-over ended: only `refused` is known not to have reached the other side. */
export type HandOver =
  | { outcome: 'sent' }
  | { outcome: 'refused'; fault: string; lasting: boolean }
  | { outcome: 'unclear'; fault: string };

interface SmtpFault extends Error {
  code?: string;
  syscall?: string;
  responseCode?: number;
  timeoutType?: string;
}

const BEFORE_THE_MAIL = new Set(['EDNS', 'EAUTH', 'ETLS', 'EENVELOPE', 'EREQUIRETLS']);
const WHILE_CONNECTING = new Set(['CONNECT_TIMEOUT', 'GREETING_TIMEOUT', 'UPGRADE_TIMEOUT']);

@Injectable()
export class MailTransport implements OnModuleDestroy {
  private readonly smtp: Transporter;

  constructor(@InjectSettings() config: Settings) {
    this.smtp = createTransport(
      { url: config.smtpUrl, connectionTimeout: 15_000, greetingTimeout: 15_000, socketTimeout: 60_000 },
      { from: config.mailFrom },
    );
  }

  onModuleDestroy(): void {
    this.smtp.close();
  }

  async handOver(mail: SendMailOptions): Promise<HandOver> {
    try {
      await this.smtp.sendMail(mail);
      return { outcome: 'sent' };
    } catch (fault) {
      return judgeFault(fault as SmtpFault);
    }
  }
}

/** A line that breaks without an answer leaves open whether the mail was taken. */
function judgeFault(fault: SmtpFault): HandOver {
  if (fault.responseCode) {
    return { outcome: 'refused', fault: fault.message, lasting: fault.responseCode >= 500 };
  }
  const neverTaken =
    fault.syscall === 'connect' ||
    BEFORE_THE_MAIL.has(fault.code ?? '') ||
    WHILE_CONNECTING.has(fault.timeoutType ?? '');
  return neverTaken
    ? { outcome: 'refused', fault: fault.message, lasting: false }
    : { outcome: 'unclear', fault: fault.message };
}
