import { api } from './api-client.ts';

/** Fetches a file with the session's token and hands it to the browser to keep. */
export async function download(
  path: string,
  query?: Record<string, string>,
  /** What the file is about, where that is more than an address holds. */
  body?: unknown,
): Promise<void> {
  const { blob, name } = await api.file(path, { query, body });
  keepFile(blob, name);
}

/** Hands a file made here to the browser to keep. */
export function keepFile(blob: Blob, name: string): void {
  const url = URL.createObjectURL(blob);
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  // Revoking at once would cancel the save in some browsers.
  setTimeout(() => URL.revokeObjectURL(url), 30_000);
}
