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
