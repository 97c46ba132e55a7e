import { createHash } from 'node:crypto';
import { jsPDF } from 'jspdf';
import { printable } from './printable';
import { Sheet } from './sheet';
import { registerWorkSans } from './work-sans';

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
  private sheets = 0;

  get sheetCount(): number {
    return this.sheets;
  }

  constructor(private readonly options: PackOptions) {
    this.doc = new jsPDF({
      unit: 'mm',
      format: [...SIZES[options.paper]],
      orientation: 'landscape',
      putOnlyUsedFonts: true,
      compress: true,
    });
    registerWorkSans(this.doc);
    this.doc.setProperties({
      title: printable(options.title),
      author: printable(options.author),
      subject: printable(options.subject),
      creator: 'Settlewright',
    });
    this.doc.setLanguage('en-US');
    this.doc.setCreationDate(pdfDate(options.issuedAt));
    this.doc.setFileId(fileId(options));
    this.doc.viewerPreferences({ DisplayDocTitle: true, PrintScaling: 'None' });
  }

  addSheet(): Sheet {
    const [width, height] = SIZES[this.options.paper];
    if (this.sheets > 0) this.doc.addPage([width, height], 'landscape');
    this.sheets += 1;
    return new Sheet(this.doc, width, height);
  }

  /** Calls back once for every sheet in order, when it is known how many there are. */
  eachSheet(finish: (sheet: Sheet, number: number, count: number) => void): void {
    const [width, height] = SIZES[this.options.paper];
    for (let number = 1; number <= this.sheets; number++) {
      this.doc.setPage(number);
      finish(new Sheet(this.doc, width, height), number, this.sheets);
    }
  }

  bytes(): Buffer {
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
