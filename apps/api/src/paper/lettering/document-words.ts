/** Unicode with a byte-order mark, which every reader of PDF 1.3 knows. */
const BIG_ENDIAN_MARK = '\u00fe\u00ff';

/**
 * A title or name for the properties of a PDF, in any script, encoded and escaped. jsPDF encodes too but leaves a
 * byte 0D bare, which a reader takes for the end of a line: "č" and "不" would come out as other letters. Hence a
 * string that no longer lets itself be escaped.
 */
class EscapedString extends String {
  override replace(): string {
    return this as unknown as string;
  }
}

export function documentWords(text: string): string {
  const line = text.normalize('NFC').replace(/\p{Cc}+/gu, ' ');
  const plain = /^[\x20-\x7e]*$/.test(line);
  const bytes = plain ? line : BIG_ENDIAN_MARK + Buffer.from(line, 'utf16le').swap16().toString('latin1');
  const escaped = bytes
    .replace(/[\\()]/g, '\\$&')
    .replace(/\r/g, '\\r')
    .replace(/\n/g, '\\n');
  return new EscapedString(escaped) as unknown as string;
}
