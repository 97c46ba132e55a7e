import type { ClothRoll } from './cloth.ts';

const EPSILON_MM = 1e-6;

/** A level stretch of the edge of what is laid: from x for a width, at y. */
export interface Ledge {
  xMm: number;
  widthMm: number;
  yMm: number;
}

/** The first value at or after `from` at which `from + control` stands on a repeat. */
export function onRepeat(from: number, repeat: number, control: number): number {
  if (repeat <= 0) return from;
  const steps = Math.ceil((from + control) / repeat - EPSILON_MM);
  return steps * repeat - control;
}

/** Upper edge of what is laid on a roll, kept as level ledges from left to right. */
export class Skyline {
  private ledges: Ledge[];

  constructor(private readonly roll: ClothRoll) {
    this.ledges = [{ xMm: 0, widthMm: roll.usableWidthMm, yMm: 0 }];
  }

  /** The lowest ledge, the leftmost of equal ones, with the walls at its sides. */
  lowest(): { index: number; ledge: Ledge; leftWallMm: number; rightWallMm: number } {
    let index = 0;
    for (let i = 1; i < this.ledges.length; i += 1) {
      if (this.ledges[i]!.yMm < this.ledges[index]!.yMm - EPSILON_MM) index = i;
    }
    const ledge = this.ledges[index]!;
    return {
      index,
      ledge,
      leftWallMm: (this.ledges[index - 1]?.yMm ?? Infinity) - ledge.yMm,
      rightWallMm: (this.ledges[index + 1]?.yMm ?? Infinity) - ledge.yMm,
    };
  }

  /** Gives a ledge up: nothing fits it, so it is raised to its lower neighbour. */
  raise(index: number): void {
    const before = this.ledges[index - 1]?.yMm ?? Infinity;
    const after = this.ledges[index + 1]?.yMm ?? Infinity;
    const level = Math.min(before, after);
    if (!Number.isFinite(level)) throw new Error('A ledge as wide as the roll cannot be raised.');
    this.ledges[index]!.yMm = level;
    this.merge();
  }

  /**
   * Where a panel lands on a ledge.
   *
   * @param ledge - the ledge
   * @param widthMm - of the panel as it lies
   * @param control - its point that falls on a repeat
   * @param atRight - against the right wall instead of the left one
   * @returns its lower left corner, `undefined` when it does not fit
   */
  landing(
    ledge: Ledge,
    widthMm: number,
    control: { acrossMm: number; alongMm: number } | undefined,
    atRight: boolean,
  ): { xMm: number; yMm: number } | undefined {
    const { acrossMm, alongMm } = this.roll.repeatMm;
    const wanted = atRight ? ledge.xMm + ledge.widthMm - widthMm : ledge.xMm;
    if (wanted < ledge.xMm - EPSILON_MM) return undefined;
    if (!control) return { xMm: wanted, yMm: ledge.yMm };
    let xMm = onRepeat(wanted, acrossMm, control.acrossMm);
    if (atRight && xMm > wanted + EPSILON_MM) xMm -= acrossMm;
    if (xMm < ledge.xMm - EPSILON_MM || xMm + widthMm > ledge.xMm + ledge.widthMm + EPSILON_MM)
      return undefined;
    return { xMm, yMm: onRepeat(ledge.yMm, alongMm, control.alongMm) };
  }

  /** Lays a panel on a ledge. */
  lay(index: number, xMm: number, topMm: number, widthMm: number): void {
    const ledge = this.ledges[index]!;
    const left = xMm - ledge.xMm;
    const right = ledge.xMm + ledge.widthMm - (xMm + widthMm);
    const pieces: Ledge[] = [{ xMm, widthMm, yMm: topMm }];
    if (left > EPSILON_MM) pieces.unshift({ xMm: ledge.xMm, widthMm: left, yMm: ledge.yMm });
    if (right > EPSILON_MM) pieces.push({ xMm: xMm + widthMm, widthMm: right, yMm: ledge.yMm });
    this.ledges.splice(index, 1, ...pieces);
    this.merge();
  }

  private merge(): void {
    const merged: Ledge[] = [];
    for (const ledge of this.ledges) {
      const last = merged[merged.length - 1];
      if (last && Math.abs(last.yMm - ledge.yMm) < EPSILON_MM) last.widthMm += ledge.widthMm;
      else merged.push(ledge);
    }
    this.ledges = merged;
  }
}
