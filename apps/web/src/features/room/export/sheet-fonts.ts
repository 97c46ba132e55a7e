import regular from '@expo-google-fonts/work-sans/400Regular/WorkSans_400Regular.ttf?url';
import semibold from '@expo-google-fonts/work-sans/600SemiBold/WorkSans_600SemiBold.ttf?url';
import type { SheetFonts } from './pdf-sheets.ts';

async function base64(address: string): Promise<string> {
  const bytes = new Uint8Array(await (await fetch(address)).arrayBuffer());
  let text = '';
  // In stretches: a call takes no more arguments than that.
  for (let at = 0; at < bytes.length; at += 8192) {
    text += String.fromCharCode(...bytes.subarray(at, at + 8192));
  }
  return btoa(text);
}

/** The letters of the printed sheets. */
export async function loadSheetFonts(): Promise<SheetFonts> {
  const [one, other] = await Promise.all([base64(regular), base64(semibold)]);
  return { regular: one, semibold: other };
}
