import { StreamableFile } from '@nestjs/common';

const TYPES = {
  csv: 'text/csv; charset=utf-8',
  dxf: 'image/vnd.dxf',
  json: 'application/json; charset=utf-8',
  pdf: 'application/pdf',
};

/** An answer that the browser keeps as a file; the name holds only letters that every system takes. */
export function download(content: string | Buffer, name: string, kind: keyof typeof TYPES): StreamableFile {
  const bytes = typeof content === 'string' ? Buffer.from(content, 'utf8') : content;
  return new StreamableFile(bytes, {
    type: TYPES[kind],
    disposition: `attachment; filename="${fileName(name)}.${kind}"`,
    length: bytes.length,
  });
}

function fileName(name: string): string {
  const plain = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, 80)
    .replace(/^-+|-+$/g, '');
  return plain || 'settlewright';
}
