import type { jsPDF } from 'jspdf';
import { printable } from './printable';
import { useWorkSans, type Weight } from './work-sans';

const MM_PER_POINT = 25.4 / 72;

/** The face never changes, and has a few hundred characters: measured once each. */
const ADVANCES: Record<Weight, Map<string, number>> = { 300: new Map(), 400: new Map(), 600: new Map() };

/** Line weights in millimetres, from guide line to what a section cuts. */
export const PEN = { hair: 0.14, fine: 0.18, edge: 0.36, frame: 0.42, cut: 0.8 } as const;

export interface TextStyle {
  /** Points. */
  size?: number;
  weight?: Weight;
  align?: 'left' | 'center' | 'right';
  /** Anticlockwise, degrees. */
  angleDeg?: number;
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
  constructor(
    private readonly doc: jsPDF,
    readonly widthMm: number,
    readonly heightMm: number,
  ) {}

  text(text: string, x: number, y: number, style: TextStyle = {}): void {
    const { angleDeg = 0, align = 'left' } = style;
    const words = printable(text);
    if (words === '') return;
    const length = this.measure(words, style);
    this.face(style);
    const back = align === 'left' ? 0 : align === 'center' ? length / 2 : length;
    const turn = (angleDeg * Math.PI) / 180;
    this.doc.text(words, x - back * Math.cos(turn), y + back * Math.sin(turn), { angle: angleDeg });
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
    let points = 0;
    for (const character of printed) points += this.advance(character, weight);
    return points * size;
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

  /** Advance of one character at one point, in millimetres. */
  private advance(character: string, weight: Weight): number {
    const known = ADVANCES[weight].get(character);
    if (known !== undefined) return known;
    this.face({ size: 100, weight });
    const width = this.doc.getTextWidth(character) / 100;
    ADVANCES[weight].set(character, width);
    return width;
  }

  private face({ size = 9, weight = 400 }: TextStyle): void {
    useWorkSans(this.doc, weight);
    this.doc.setFontSize(size);
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
