import type { Pack } from './pack';
import { PEN, type Sheet } from './sheet';
import { type Frame, frameOf } from './title-block';

/** Room between the frame and what is written in it. */
export const PAD = 4;
const HEAD_MM = 9;

/** A page of an order as it is being filled. */
export interface OrderPage {
  sheet: Sheet;
  frame: Frame;
  /** Where the next thing begins. */
  y: number;
}

/** The sheets of an order, each with what its title block says of it. */
export class OrderPages {
  private readonly topics: (readonly string[])[] = [];

  constructor(private readonly pdf: Pack) {}

  /** A new sheet. Lines: what stands under "On this sheet". */
  add(topic: readonly string[]): Sheet {
    this.topics.push(topic);
    return this.pdf.addSheet();
  }

  /** A new sheet with a heading, to be filled from above. */
  page(topic: readonly string[], heading: string, aside = ''): OrderPage {
    const sheet = this.add(topic);
    const frame = frameOf(sheet);
    sheet.text(heading, frame.left + PAD, frame.top + 6.2, { size: 10.5, weight: 600 });
    if (aside) sheet.text(aside, frame.right - PAD, frame.top + 6.2, { align: 'right' });
    sheet.line(frame.left, frame.top + HEAD_MM, frame.right, frame.top + HEAD_MM, { pen: PEN.fine });
    return { sheet, frame, y: frame.top + HEAD_MM };
  }

  topicOf(number: number): readonly string[] {
    return this.topics[number - 1] ?? [];
  }
}
