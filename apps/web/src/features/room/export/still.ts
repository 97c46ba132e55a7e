/** Draws the scene now and gives its canvas, to be copied before the browser clears it. */
export type Taker = () => HTMLCanvasElement;

let taker: Taker | null = null;

/** Called by the scene while it is on the screen; the answer takes the offer back. */
export function offerStill(next: Taker): () => void {
  taker = next;
  return () => {
    if (taker === next) taker = null;
  };
}

/** The scene as it stands on the screen, on the ground of its page; nothing when no scene is drawn. */
export async function takeStill(ground: string): Promise<Blob | null> {
  const canvas = taker?.();
  const copy = canvas && onGround(canvas, ground);
  return copy ? pngOf(copy) : null;
}

/** A copy of a picture before the browser clears it, on the ground of its page. */
export function onGround(canvas: HTMLCanvasElement, ground: string): HTMLCanvasElement | null {
  const copy = document.createElement('canvas');
  copy.width = canvas.width;
  copy.height = canvas.height;
  const pen = copy.getContext('2d');
  if (!pen) return null;
  pen.fillStyle = ground;
  pen.fillRect(0, 0, copy.width, copy.height);
  pen.drawImage(canvas, 0, 0);
  return copy;
}

/** A picture as a file. */
export const pngOf = (canvas: HTMLCanvasElement): Promise<Blob | null> =>
  new Promise((resolve) => canvas.toBlob(resolve, 'image/png'));
