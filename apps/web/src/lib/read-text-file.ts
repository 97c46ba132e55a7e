/** Largest file that is read: 2 MB. */
export const LARGEST_CSV_BYTES = 2_000_000;

/** The text of a file; one that is not UTF-8 is read as the older Windows encoding spreadsheets still write. */
export async function readTextFile(file: File): Promise<string> {
  const bytes = await file.arrayBuffer();
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return new TextDecoder('windows-1252').decode(bytes);
  }
}
