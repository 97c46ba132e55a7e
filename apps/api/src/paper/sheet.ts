import type { jsPDF } from 'jspdf';
import { type Weight, useFace } from './lettering/faces';
import { printable, ROMANISED } from './lettering/printable';
import { type Direction, runWidth, textRuns } from './lettering/text-runs';

export const MM_PER_POINT = 25.4 / 72;

/** Line weights in millimetres, from guide line to what a section cuts. */
export const PEN = { hair: 0.14, fine: 0.18, edge: 0.36, frame: 0.42, cut: 0.8 } as const;

export interface TextStyle {
  /** Points. */
  size?: number;
  weight?: Weight;
  align?: 'left' | 'center' | 'right';
  /** Anticlockwise, degrees. */
  angleDeg?: number;
  /** Reading direction; that of the first letter when absent. */
  direction?: Direction;
}

export interface LineStyle {
  pen?: number;
  dash?: readonly number[];
  /** 0 black, 255 white. */
  grey?: number;
}

export interface ShapeStyle extends LineStyle {
  /** Grey of the ground; none when absent. */
  fill?: number;
  /** No edge. */
  bare?: boolean;
}

export type Point = readonly [number, number];

/** One page in millimetres, y downwards, with the few marks a drawing needs. Black on white, always. */
export class Sheet {
  private romanised = false;

  constructor(
    private readonly doc: jsPDF,
    readonly widthMm: number,
    readonly heightMm: number,
  ) {}

  /** Whether something on the sheet stands there romanised. */
  get hasRomanised(): boolean {
    return this.romanised;
  }

  text(text: string, x: number, y: number, style: TextStyle = {}): void {
    const { angleDeg = 0, align = 'left', size = 9, weight = 400, direction } = style;
    const words = printable(text);
    if (words === '') return;
    this.romanised ||= words.includes(ROMANISED);
    const back = align === 'left' ? 0 : this.measure(words, style) / (align === 'center' ? 2 : 1);
    const turn = (angleDeg * Math.PI) / 180;
    let along = -back;
    for (const run of textRuns(words, direction)) {
      useFace(this.doc, run.face, weight, size);
      const [left, baseline] = [x + along * Math.cos(turn), y - along * Math.sin(turn)];
      // The runs stand in drawing order already: jsPDF is told to turn nothing.
      this.doc.text(run.text, left, baseline, { angle: angleDeg, isInputVisual: true, isOutputVisual: true });
      along += runWidth(run, weight) * size * MM_PER_POINT;
    }
  }

  /** Text with a white ground under it, so that a line may run behind. */
  flag(text: string, x: number, y: number, style: TextStyle = {}): void {
    const { size = 9, align = 'left', angleDeg = 0 } = style;
    const width = this.textWidth(text, style);
    const high = size * MM_PER_POINT;
    const back = align === 'left' ? 0 : align === 'center' ? width / 2 : width;
    if (angleDeg === 0) {
      this.rect(x - back - 0.6, y - high * 0.8, width + 1.2, high, { fill: 255, bare: true });
    } else {
      this.rect(x - high * 0.8, y - width + back - 0.6, high, width + 1.2, { fill: 255, bare: true });
    }
    this.text(text, x, y, style);
  }

  textWidth(text: string, style: TextStyle = {}): number {
    return this.measure(printable(text), style);
  }

  /** As `textWidth`, of text that is printable already. */
  measure(printed: string, style: TextStyle = {}): number {
    const { size = 9, weight = 400 } = style;
    const points = textRuns(printed).reduce((sum, run) => sum + runWidth(run, weight), 0);
    return points * size * MM_PER_POINT;
  }

  line(x1: number, y1: number, x2: number, y2: number, style: LineStyle = {}): void {
    this.pen(style);
    this.doc.line(x1, y1, x2, y2);
  }

  rect(x: number, y: number, width: number, height: number, style: ShapeStyle = {}): void {
    this.pen(style);
    this.doc.rect(x, y, width, height, this.paint(style));
  }

  circle(x: number, y: number, radius: number, style: ShapeStyle = {}): void {
    this.pen(style);
    this.doc.circle(x, y, radius, this.paint(style));
  }

  path(points: readonly Point[], style: ShapeStyle & { closed?: boolean } = {}): void {
    const [first, ...rest] = points;
    if (!first) return;
    this.pen(style);
    this.doc.moveTo(first[0], first[1]);
    for (const [x, y] of rest) this.doc.lineTo(x, y);
    if (style.closed) this.doc.close();
    const paint = this.paint(style);
    if (paint === 'S') this.doc.stroke();
    else if (paint === 'F') this.doc.fill();
    else this.doc.fillStroke();
  }

  /** Short strokes at 45 degrees along one side of an upright line: a wall that goes on. */
  hatchBeside(x: number, y1: number, y2: number, side: 1 | -1): void {
    for (let y = y1 + 1.6; y <= y2; y += 1.6) this.line(x, y, x + 1.6 * side, y - 1.6, { pen: PEN.hair });
  }

  private pen({ pen = PEN.fine, dash = [], grey = 0 }: LineStyle): void {
    this.doc.setLineWidth(pen);
    this.doc.setDrawColor(grey);
    this.doc.setLineDashPattern([...dash], 0);
  }

  private paint({ fill, bare }: ShapeStyle): 'S' | 'F' | 'FD' {
    if (fill === undefined) return 'S';
    this.doc.setFillColor(fill, fill, fill);
    return bare ? 'F' : 'FD';
  }
}

/** Height of a line of text in millimetres. */
export function leading(size: number): number {
  return size * 1.25 * MM_PER_POINT;
}
