declare module 'mailparser' {
  import type { Readable } from 'node:stream';

  export interface ParsedMail {
    subject?: string;
    text?: string;
    messageId?: string;
    from?: { text: string };
    replyTo?: { text: string };
    attachments: { filename?: string; contentType: string; content: Buffer }[];
  }

  export function simpleParser(source: Readable): Promise<ParsedMail>;
}
