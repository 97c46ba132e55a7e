/** A font as a data URL, for a file that loads nothing from outside itself. */
export async function fontDataUrl(address: string): Promise<string> {
  const file = await (await fetch(address)).blob();
  return new Promise((resolve, reject) => {
    const reader = new FileReader();
    reader.onload = () => resolve(reader.result as string);
    reader.onerror = () => reject(new Error('A font could not be read.'));
    reader.readAsDataURL(file);
  });
}
