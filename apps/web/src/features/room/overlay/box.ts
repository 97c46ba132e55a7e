/** Labels keep so far off the edge of the sheet, CSS pixels. */
export const EDGE = 6;
/** A head as labels keep clear of it. */
export const HEAD_WIDTH_MM = 160;

/** Edges of something on the sheet, CSS pixels. */
export interface Box {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

/** The box of a size about its middle. */
export const boxAt = (x: number, y: number, width: number, height: number): Box => ({
  left: x - width / 2,
  right: x + width / 2,
  top: y - height / 2,
  bottom: y + height / 2,
});

/** The box of something placed by its middle. */
export const boxOf = ({
  x,
  y,
  width,
  height,
}: {
  x: number;
  y: number;
  width: number;
  height: number;
}): Box => boxAt(x, y, width, height);

/** Whether two boxes come nearer to each other than a gap. */
export const meet = (a: Box, b: Box, gap: number): boolean =>
  a.left < b.right + gap && b.left < a.right + gap && a.top < b.bottom + gap && b.top < a.bottom + gap;

/** Where labels stand on the sheet just now, for what keeps clear of them. */
export interface LabelBoxes {
  now: () => readonly Box[];
  tell: (boxes: readonly Box[]) => void;
}

export function createLabelBoxes(): LabelBoxes {
  let boxes: readonly Box[] = [];
  return {
    now: () => boxes,
    tell: (next) => {
      boxes = next;
    },
  };
}
