import { StreamableFile } from '@nestjs/common';

export function pdfFile(bytes: Buffer, number: number, letter: string): StreamableFile {
  return new StreamableFile(bytes, {
    type: 'application/pdf',
    disposition: `inline; filename="cushion-order-${number}-${letter}.pdf"`,
    length: bytes.length,
  });
}
