import type { LengthStyle } from '@settlewright/geometry';
import { jsPDF } from 'jspdf';

/** Landscape sheets, millimetres. */
export const PAPERS = { a4: [297, 210], letter: [279.4, 215.9] } as const;
export type PaperKey = keyof typeof PAPERS;

export const MARGIN_MM = 9;
const FOOT_MM = 17;
const MM_PER_POINT = 25.4 / 72;
/** Three inches, as on the other papers: whoever holds the print can see whether the printer kept the scale. */
const CHECK_BAR_MM = 76.2;
const WHITE = 255;

export const GUIDANCE = 'Guidance for making, not certification.';

/** What the sheets carry beside the drawing. */
export interface SheetWords {
  setName: string;
  /** "Draft of 2 December 2026". */
  version: string;
  style: LengthStyle;
}

export interface SheetFonts {
  regular: string;
  semibold: string;
}

/** What is free on a sheet for the drawing. */
export function freeSpace(paper: PaperKey): { widthMm: number; heightMm: number } {
  const [width, height] = PAPERS[paper];
  return { widthMm: width - 2 * MARGIN_MM - 4, heightMm: height - 2 * MARGIN_MM - FOOT_MM - 4 };
}

const UNPRINTED = /[^\u0020-\u024f\u2010-\u2033\u2044\u2070-\u208e\u2153-\u215e\u2190-\u2199\u2212]/gu;

/** Letters that the sheets cannot carry, each once: Work Sans holds the Latin ones. Asked before anything is saved. */
export const unprinted = (texts: readonly string[]): string[] => [
  ...new Set(texts.flatMap((text) => text.replaceAll('\u202f', ' ').match(UNPRINTED) ?? [])),
];

/** Work Sans has no narrow space; what it lacks is a dot. */
export function printable(text: string): string {
  return text.replaceAll('\u202f', '\u00a0').replace(UNPRINTED, '·');
}

function addFonts(doc: jsPDF, fonts: SheetFonts): void {
  doc.addFileToVFS('regular.ttf', fonts.regular);
  doc.addFont('regular.ttf', 'Work Sans', 'normal');
  doc.addFileToVFS('semibold.ttf', fonts.semibold);
  doc.addFont('semibold.ttf', 'Work Sans', 'bold');
}

/** Writes words that stand level, their middle at a height. */
export function write(
  doc: jsPDF,
  text: string,
  at: readonly [number, number],
  {
    sizeMm,
    bold = false,
    align = 'left',
    flag = false,
  }: { sizeMm: number; bold?: boolean; align?: 'left' | 'center' | 'right'; flag?: boolean },
): void {
  doc.setFont('Work Sans', bold ? 'bold' : 'normal');
  doc.setFontSize(sizeMm / MM_PER_POINT);
  const words = printable(text);
  if (flag) {
    const width = doc.getTextWidth(words);
    const left = align === 'left' ? at[0] : align === 'right' ? at[0] - width : at[0] - width / 2;
    doc.setFillColor(WHITE, WHITE, WHITE);
    doc.rect(left - 0.3, at[1] - sizeMm * 0.42, width + 0.6, sizeMm * 0.84, 'F');
  }
  doc.text(words, at[0], at[1] + sizeMm * 0.34, { align });
}

/** Frame and title block of a sheet: two columns of three rows, and for what is to scale a bar that checks the print. */
export function drawFrame(
  doc: jsPDF,
  paper: PaperKey,
  rows: { left: readonly string[]; middle: readonly string[] },
  withBar: boolean,
): void {
  const [width, height] = PAPERS[paper];
  const foot = height - MARGIN_MM - FOOT_MM;
  doc.setDrawColor(0);
  doc.setLineWidth(0.42);
  doc.rect(MARGIN_MM, MARGIN_MM, width - 2 * MARGIN_MM, height - 2 * MARGIN_MM);
  doc.line(MARGIN_MM, foot, width - MARGIN_MM, foot);
  const row = (n: number) => foot + 4.2 + n * 4.4;
  rows.left.forEach((text, n) =>
    write(doc, text, [MARGIN_MM + 3, row(n)], { sizeMm: n === 0 ? 3.6 : 3.2, bold: n === 0 }),
  );
  rows.middle.forEach((text, n) => write(doc, text, [MARGIN_MM + 92, row(n)], { sizeMm: 3.2 }));
  if (!withBar) return;
  const [end, bar] = [width - MARGIN_MM - 4, row(2) - 0.6];
  write(doc, 'this bar is 3″ (76.2 mm) long on paper', [end - CHECK_BAR_MM / 2, bar - 4], {
    sizeMm: 3.2,
    align: 'center',
  });
  doc.setLineWidth(0.36);
  doc.line(end - CHECK_BAR_MM, bar, end, bar);
  for (const n of [0, 1, 2, 3]) {
    doc.line(end - (n * CHECK_BAR_MM) / 3, bar - 1.5, end - (n * CHECK_BAR_MM) / 3, bar + 1.5);
  }
}

/** An empty document of landscape sheets with the letters of the product. */
export function startSheets(title: string, paper: PaperKey, fonts: SheetFonts): jsPDF {
  const doc = new jsPDF({ unit: 'mm', format: [...PAPERS[paper]], orientation: 'landscape', compress: true });
  addFonts(doc, fonts);
  doc.setProperties({ title: printable(title), creator: 'Settlewright' });
  doc.viewerPreferences({ DisplayDocTitle: true, PrintScaling: 'None' });
  return doc;
}
