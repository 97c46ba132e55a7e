import { drawFrame, freeSpace, GUIDANCE, MARGIN_MM, PAPERS, startSheets } from './sheet-frame.ts';
import type { PaperKey, SheetFonts, SheetWords } from './sheet-frame.ts';

/** A picture of a named view, and what is said of it. */
export interface ViewPicture {
  name: string;
  /** The line of its lens, or which lettered view it is. */
  about: readonly string[];
  picture: HTMLCanvasElement;
}

/** How finely a picture is kept on paper; ink lines show what a coarser one does to them. */
const JPEG_QUALITY = 0.92;

/** Named views, one on each sheet, as large as goes. */
export function pdfOfViews(
  views: readonly ViewPicture[],
  words: SheetWords,
  paper: PaperKey,
  fonts: SheetFonts,
): ArrayBuffer {
  const doc = startSheets(`${words.setName}, ${views.map(({ name }) => name).join(', ')}`, paper, fonts);
  const free = freeSpace(paper);
  views.forEach(({ name, about, picture }, n) => {
    if (n > 0) doc.addPage([...PAPERS[paper]], 'landscape');
    const scale = Math.min(free.widthMm / picture.width, free.heightMm / picture.height);
    const [width, height] = [picture.width * scale, picture.height * scale];
    const [x, y] = [MARGIN_MM + 2 + (free.widthMm - width) / 2, MARGIN_MM + 2 + (free.heightMm - height) / 2];
    doc.addImage(picture.toDataURL('image/jpeg', JPEG_QUALITY), 'JPEG', x, y, width, height);
    doc.setDrawColor(0);
    doc.setLineWidth(0.25);
    doc.rect(x, y, width, height);
    const left = [words.setName, name, words.version];
    const middle = [about.join('; '), `Not to scale. Sheet ${n + 1} of ${views.length}`, GUIDANCE];
    drawFrame(doc, paper, { left, middle }, false);
  });
  return doc.output('arraybuffer');
}
