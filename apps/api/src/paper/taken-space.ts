import { MM_PER_POINT, type Sheet, type TextStyle } from './sheet';

/** A box of the sheet, millimetres. */
export interface SheetBox {
  x: number;
  y: number;
  width: number;
  height: number;
}

/** Where words may stand. */
export interface WordPlace {
  x: number;
  /** Baseline of level words; middle of upright ones. */
  y: number;
  align?: TextStyle['align'];
}

const CLEAR_MM = 0.5;

/** What a figure has on it already, so that no words are written over others. */
export class TakenSpace {
  private readonly boxes: SheetBox[] = [];

  take(box: SheetBox): void {
    this.boxes.push(box);
  }

  isFree(box: SheetBox): boolean {
    return !this.boxes.some((other) => overlap(box, other));
  }

  /** Writes words on a white ground at the first place that is free; says whether there was one. */
  write(sheet: Sheet, text: string, places: readonly WordPlace[], style: TextStyle = {}): boolean {
    for (const { x, y, align } of places) {
      const own = { ...style, align: align ?? style.align ?? 'left' };
      const box = wordsBox(sheet, text, x, y, own);
      if (!this.isFree(box)) continue;
      this.take(box);
      sheet.flag(text, x, y, own);
      return true;
    }
    return false;
  }
}

/** The box that words fill. */
export function wordsBox(sheet: Sheet, text: string, x: number, y: number, style: TextStyle): SheetBox {
  const { size = 9, align = 'left', angleDeg = 0 } = style;
  const length = sheet.textWidth(text, style);
  const high = size * MM_PER_POINT;
  const back = align === 'left' ? 0 : align === 'center' ? length / 2 : length;
  const [clear, both] = [CLEAR_MM, 2 * CLEAR_MM];
  return angleDeg === 0
    ? { x: x - back - clear, y: y - high * 0.8 - clear, width: length + both, height: high + both }
    : { x: x - high * 0.8 - clear, y: y - length + back - clear, width: high + both, height: length + both };
}

function overlap(a: SheetBox, b: SheetBox): boolean {
  return a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;
}
