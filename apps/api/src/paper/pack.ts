import { createHash } from 'node:crypto';
import { jsPDF } from 'jspdf';
import { documentWords } from './lettering/document-words';
import { findableLetters } from './lettering/faces';
import { Sheet } from './sheet';

export type Paper = 'a4' | 'letter';

const SIZES: Record<Paper, readonly [number, number]> = { a4: [297, 210], letter: [279.4, 215.9] };

export interface PackOptions {
  paper: Paper;
  title: string;
  author: string;
  subject: string;
  /** Stands as the file's date, so that the same revision always gives the same bytes. */
  issuedAt: Date;
}

/** A PDF of landscape sheets. The same sheets and options give the same bytes. */
export class Pack {
  private readonly doc: jsPDF;
  private readonly sheets: Sheet[] = [];

  get sheetCount(): number {
    return this.sheets.length;
  }

  constructor(private readonly options: PackOptions) {
    this.doc = new jsPDF({
      unit: 'mm',
      format: [...SIZES[options.paper]],
      orientation: 'landscape',
      putOnlyUsedFonts: true,
      compress: true,
    });
    this.doc.setProperties({
      title: documentWords(options.title),
      author: documentWords(options.author),
      subject: documentWords(options.subject),
      creator: 'Settlewright',
    });
    this.doc.setLanguage('en-US');
    this.doc.setCreationDate(pdfDate(options.issuedAt));
    this.doc.setFileId(fileId(options));
    this.doc.viewerPreferences({ DisplayDocTitle: true, PrintScaling: 'None' });
  }

  addSheet(): Sheet {
    const [width, height] = SIZES[this.options.paper];
    if (this.sheets.length > 0) this.doc.addPage([width, height], 'landscape');
    const sheet = new Sheet(this.doc, width, height);
    this.sheets.push(sheet);
    return sheet;
  }

  /** Calls back once for every sheet in order, when it is known how many there are. */
  eachSheet(finish: (sheet: Sheet, number: number, count: number) => void): void {
    this.sheets.forEach((sheet, index) => {
      this.doc.setPage(index + 1);
      finish(sheet, index + 1, this.sheets.length);
    });
  }

  bytes(): Buffer {
    findableLetters(this.doc);
    return Buffer.from(this.doc.output('arraybuffer'));
  }
}

function pdfDate(date: Date): string {
  const digits = date.toISOString().replace(/\D/g, '').slice(0, 14);
  return `D:${digits}+00'00'`;
}

function fileId(options: PackOptions): string {
  const seed = JSON.stringify([
    options.title,
    options.author,
    options.subject,
    options.issuedAt,
    options.paper,
  ]);
  return createHash('sha256').update(seed).digest('hex').slice(0, 32).toUpperCase();
}
