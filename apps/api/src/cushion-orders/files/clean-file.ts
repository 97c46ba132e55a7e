import sharp from 'sharp';
import { Problem } from '../../common/problem';
import type { FileType } from './order-file.entity';

/** What one file may hold. */
export const FILE_LIMITS = {
  bytes: 15 * 1024 * 1024,
  bytesWords: '15 MB',
  pixels: 60_000_000,
  pixelsWords: '60 megapixels',
  /** of the longer side, after it is made smaller */
  keptPx: 3000,
};

/** What one order may hold. */
export const ORDER_LIMITS = { files: 120, bytes: 400 * 1024 * 1024, bytesWords: '400 MB' };

export interface CleanFile {
  type: FileType;
  content: Buffer;
  widthPx: number | null;
  heightPx: number | null;
}

const QUALITY = 85;
const ACCEPTED = 'Accepted: photographs as JPEG, PNG or WebP, and PDF';

/** What a file is, by its own first bytes: what its name or sender says does not count. */
export function kindOf(content: Buffer): 'image' | 'pdf' | 'heic' | 'unknown' {
  const ascii = (from: number, to: number) => content.toString('latin1', from, to);
  if (ascii(0, 5) === '%PDF-') return 'pdf';
  if (content.length > 3 && content.readUIntBE(0, 3) === 0xffd8ff) return 'image';
  if (ascii(0, 8) === '\x89PNG\r\n\x1a\n') return 'image';
  if (ascii(0, 4) === 'RIFF' && ascii(8, 12) === 'WEBP') return 'image';
  if (ascii(4, 8) === 'ftyp' && /hei|hev|mif1|msf1/.test(ascii(8, 32))) return 'heic';
  return 'unknown';
}

/**
 * A photograph is drawn anew, turned upright, with nothing in it but the picture: no place, no time, no camera. A PDF is kept
 * as it came.
 */
export async function cleanFile(content: Buffer): Promise<CleanFile> {
  switch (kindOf(content)) {
    case 'pdf':
      return { type: 'application/pdf', content, widthPx: null, heightPx: null };
    case 'image':
      return cleanImage(content);
    case 'heic':
      throw refuse(
        'HEIC pictures cannot be read here. Send it as JPEG: on a phone, choose "most compatible".',
      );
    case 'unknown':
      throw refuse(`This is none of the kinds of file that can be kept. ${ACCEPTED}.`);
  }
}

async function cleanImage(content: Buffer): Promise<CleanFile> {
  try {
    const { data, info } = await sharp(content, {
      limitInputPixels: FILE_LIMITS.pixels,
      failOn: 'error',
      pages: 1,
    })
      .rotate()
      .resize({
        width: FILE_LIMITS.keptPx,
        height: FILE_LIMITS.keptPx,
        fit: 'inside',
        withoutEnlargement: true,
      })
      .flatten({ background: '#ffffff' })
      .toColourspace('srgb')
      .jpeg({ quality: QUALITY })
      .toBuffer({ resolveWithObject: true });
    return { type: 'image/jpeg', content: data, widthPx: info.width, heightPx: info.height };
  } catch {
    throw refuse(
      `The picture cannot be read, or has more than ${FILE_LIMITS.pixelsWords}. Save it anew and try again.`,
    );
  }
}

function refuse(message: string): Problem {
  return Problem.invalid([{ path: 'file', code: 'file-refused', message }], message);
}
