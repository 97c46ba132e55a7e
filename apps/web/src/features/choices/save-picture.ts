import font300 from '@fontsource/work-sans/files/work-sans-latin-300-normal.woff2?url';
import font400 from '@fontsource/work-sans/files/work-sans-latin-400-normal.woff2?url';
import font500 from '@fontsource/work-sans/files/work-sans-latin-500-normal.woff2?url';
import font600 from '@fontsource/work-sans/files/work-sans-latin-600-normal.woff2?url';
import { keepFile } from '@/lib/download.ts';
import { fontDataUrl } from '@/lib/font-data.ts';

/** What stands around a drawing that leaves the page. */
export interface PictureWords {
  title: string;
  /** Lines under the title: what moves, where it is from, which revision, units. */
  above: readonly string[];
  /** Sentences under the drawing, the caution last. */
  below: readonly string[];
}

const FONTS = { 300: font300, 400: font400, 500: font500, 600: font600 };
const SCALE = 2;
const EDGE = 28;
const TITLE = 44;
const LINE = 20;
const LETTER = 6.6;

/** A drawing with its words as a picture of twice the size on the screen. */
export async function pictureOf(drawing: SVGSVGElement, words: PictureWords): Promise<HTMLCanvasElement> {
  const [fonts, palette] = [await fontRules(), lightPalette()];
  const { markup, width, height } = sheetOf(drawing, words, `${fonts}svg{${palette}}`);
  const image = await loaded(new Blob([markup], { type: 'image/svg+xml' }));
  const canvas = document.createElement('canvas');
  canvas.width = width * SCALE;
  canvas.height = height * SCALE;
  canvas.getContext('2d')?.drawImage(image, 0, 0, canvas.width, canvas.height);
  return canvas;
}

function sheetOf(drawing: SVGSVGElement, { title, above, below }: PictureWords, rules: string) {
  const [inner, tall] = [drawing.width.baseVal.value, drawing.height.baseVal.value];
  const width = inner + 2 * EDGE;
  const letters = Math.floor(inner / LETTER);
  const heads = above.flatMap((line) => folded(line, letters));
  const feet = below.flatMap((line) => folded(line, letters));
  const top = EDGE + TITLE + heads.length * LINE + 16;
  const height = top + tall + 16 + feet.length * LINE + EDGE;
  const line = (words: string, y: number) =>
    `<text x="${EDGE}" y="${y}" font-size="13" fill="var(--color-ink-2)">${escaped(words)}</text>`;
  const copy = drawing.cloneNode(true) as SVGSVGElement;
  copy.setAttribute('x', String(EDGE));
  copy.setAttribute('y', String(top));
  const markup = `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}" viewBox="0 0 ${width} ${height}">
<style>${rules} text{font-family:'Work Sans',sans-serif;font-feature-settings:'tnum'}</style>
<rect width="${width}" height="${height}" fill="var(--color-paper)"/>
<text x="${EDGE}" y="${EDGE + 26}" font-size="30" font-weight="300" fill="var(--color-ink)">${escaped(title)}</text>
${heads.map((words, n) => line(words, EDGE + TITLE + 6 + n * LINE)).join('')}
${new XMLSerializer().serializeToString(copy)}
${feet.map((words, n) => line(words, top + tall + 24 + n * LINE)).join('')}
</svg>`;
  return { markup, width, height };
}

const escaped = (text: string): string => text.replace(/[&<>"]/g, (sign) => `&#${sign.charCodeAt(0)};`);

/** A sentence in lines of so many letters. */
function folded(text: string, letters: number): string[] {
  const lines: string[] = [];
  for (const word of text.split(' ')) {
    const last = lines.at(-1);
    if (last !== undefined && last.length + word.length < letters)
      lines[lines.length - 1] = `${last} ${word}`;
    else lines.push(word);
  }
  return lines;
}

/** A picture loads nothing from outside itself. */
async function fontRules(): Promise<string> {
  const rules = Object.entries(FONTS).map(async ([weight, address]) => {
    return `@font-face{font-family:'Work Sans';font-weight:${weight};src:url(${await fontDataUrl(address)}) format('woff2')}`;
  });
  return (await Promise.all(rules)).join('');
}

/** The colours of the light sheet, whatever the page wears now: a sheet that is sent is always light. */
function lightPalette(): string {
  const root = document.documentElement;
  const worn = root.dataset.theme;
  root.dataset.theme = 'light';
  const style = getComputedStyle(root);
  const names = new Set(document.documentElement.outerHTML.match(/--color-[a-z0-9-]+/g));
  const rules = [...names].map((name) => `${name}:${style.getPropertyValue(name)}`).join(';');
  root.dataset.theme = worn;
  return rules;
}

function loaded(file: Blob): Promise<HTMLImageElement> {
  return new Promise((resolve, reject) => {
    const address = URL.createObjectURL(file);
    const image = new Image();
    image.onload = () => {
      URL.revokeObjectURL(address);
      resolve(image);
    };
    image.onerror = () => {
      URL.revokeObjectURL(address);
      reject(new Error('The picture could not be drawn.'));
    };
    image.src = address;
  });
}

/** Hands a picture to the browser to keep. */
export async function keepPng(canvas: HTMLCanvasElement, name: string): Promise<void> {
  const file = await new Promise<Blob | null>((resolve) => canvas.toBlob(resolve, 'image/png'));
  if (!file) throw new Error('The picture could not be drawn.');
  keepFile(file, `${name}.png`);
}
