import { leading, PEN } from '../../paper/sheet';
import type { Flow } from './flow';

/** The words over a section of the sheet under a line of its own, on a new sheet unless something fits below. */
export function drawSectionHeading(flow: Flow, words: string): void {
  flow.need(26);
  flow.sheet.line(flow.left, flow.y, flow.right, flow.y, { pen: PEN.edge });
  flow.y += leading(9) + 1.6;
  flow.sheet.text(words, flow.left, flow.y, { size: 11, weight: 600 });
  flow.y += 2.4;
}
