import type { Pack } from '../../paper/pack';
import { paragraph } from '../../paper/paragraph';
import { leading, PEN, type Sheet } from '../../paper/sheet';
import { type Frame, frameOf } from '../../paper/title-block';
import { CAUTION } from '../shown-sheet';

const PAD_MM = 5;
const CAUTION_MM = 7;

/** Where the next line goes, over as many sheets as it takes. Every sheet carries the caution at its foot. */
export class Flow {
  sheet: Sheet;
  /** Upper edge of what comes next. */
  y = 0;
  left = 0;
  right = 0;
  private foot = 0;

  constructor(private readonly pack: Pack) {
    this.sheet = this.nextSheet();
  }

  get width(): number {
    return this.right - this.left;
  }

  /** Room down to the caution. */
  get room(): number {
    return this.foot - this.y;
  }

  /** Goes on to a new sheet unless so much room is left; tells whether it did. */
  need(heightMm: number): boolean {
    if (heightMm <= this.room) return false;
    this.nextSheet();
    return true;
  }

  nextSheet(): Sheet {
    this.sheet = this.pack.addSheet();
    const frame: Frame = frameOf(this.sheet);
    this.left = frame.left + PAD_MM;
    this.right = frame.right - PAD_MM;
    this.y = frame.top + PAD_MM;
    this.foot = frame.bottom - CAUTION_MM - 1;
    this.sheet.line(this.left, frame.bottom - CAUTION_MM, this.right, frame.bottom - CAUTION_MM, {
      pen: PEN.hair,
    });
    paragraph(this.sheet, CAUTION, this.left, frame.bottom - CAUTION_MM + leading(9) + 0.6, this.width);
    return this.sheet;
  }
}
