import regular from '@expo-google-fonts/work-sans/400Regular/WorkSans_400Regular.ttf?url';
import semibold from '@expo-google-fonts/work-sans/600SemiBold/WorkSans_600SemiBold.ttf?url';
import { fontDataUrl } from '@/lib/font-data.ts';
import type { SheetFonts } from './sheet-frame.ts';

const base64 = async (address: string): Promise<string> => (await fontDataUrl(address)).split(',')[1] ?? '';

/** The letters of the printed sheets. */
export async function loadSheetFonts(): Promise<SheetFonts> {
  const [one, other] = await Promise.all([base64(regular), base64(semibold)]);
  return { regular: one, semibold: other };
}
