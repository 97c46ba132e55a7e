import { StreamableFile } from '@nestjs/common';
import type { Response } from 'express';
import type { OrderFile } from './order-file.entity';

/** A file that somebody sent, as bytes that can do nothing in a browser: typed by us, in a sandbox, for this reader only. */
export function servedFile(
  response: Response,
  { file, content }: { file: OrderFile; content: Buffer },
): StreamableFile {
  const shown = file.type === 'image/jpeg' ? 'inline' : 'attachment';
  response.set({
    'X-Content-Type-Options': 'nosniff',
    'Content-Security-Policy': "default-src 'none'; sandbox",
    'Cross-Origin-Resource-Policy': 'same-origin',
    'Cache-Control': 'private, no-store',
  });
  const plain = file.name.replace(/[^\w.\- ]/g, '_');
  return new StreamableFile(content, {
    type: file.type,
    disposition: `${shown}; filename="${plain}"; filename*=UTF-8''${encodeURIComponent(file.name)}`,
    length: content.length,
  });
}
