import type { OrderPages } from './order-pages';
import { paragraph } from './paragraph';
import { drawQrCode, type QrCode, qrCode } from './qr-code';
import { PEN, type Sheet } from './sheet';
import type { BagLabel, SpecPack } from './spec-pack';
import { frameOf } from './title-block';

const ACROSS = 2;
const DOWN = 4;
const QR_MM = 29;
/** Share of a label that goes inside the zip. */
const INSIDE = 0.3;

/** A label for the bag of every cushion, with a strip to sew inside its closure. */
export function drawLabels(pages: OrderPages, pack: SpecPack): void {
  const { labels } = pack;
  const code = qrCode(pack.order.pageUrl);
  for (let from = 0; from < labels.length; from += ACROSS * DOWN) {
    const some = labels.slice(from, from + ACROSS * DOWN);
    const sheet = pages.add(['Labels', `${some[0]?.mark ?? ''} to ${some.at(-1)?.mark ?? ''}`]);
    const { left, top, right, bottom } = frameOf(sheet);
    const [width, height] = [(right - left) / ACROSS, (bottom - top) / DOWN];
    some.forEach((label, n) => {
      const [column, row] = [n % ACROSS, Math.floor(n / ACROSS)];
      drawLabel(
        sheet,
        pack,
        { label, code },
        { x: left + column * width, y: top + row * height, width, height },
      );
    });
  }
}

function drawLabel(
  sheet: Sheet,
  pack: SpecPack,
  { label, code }: { label: BagLabel; code: QrCode },
  box: { x: number; y: number; width: number; height: number },
): void {
  const { x, y, width, height } = box;
  const cut = { pen: PEN.hair, dash: [2, 1.4], grey: 90 };
  sheet.rect(x, y, width, height, cut);
  const split = x + width * (1 - INSIDE);
  sheet.line(split, y, split, y + height, cut);
  drawQrCode(sheet, code, { x: x + 1.5, y: y + 2, sizeMm: QR_MM });
  sheet.text('the order’s page', x + 1.5 + QR_MM / 2, y + QR_MM + 4.6, { align: 'center' });
  const textX = x + QR_MM + 4;
  const room = split - textX - 2;
  sheet.text(label.mark, textX, y + 11.5, { size: 26, weight: 600 });
  sheet.text(`${label.number} of ${label.count}`, split - 3, y + 8, { align: 'right', weight: 600 });
  sheet.text(`revision ${pack.revision.letter}`, split - 3, y + 12.6, { align: 'right' });
  let at = y + 17.6;
  for (const line of [
    label.place,
    label.hand,
    `${pack.production}, ${pack.set}`,
    `Order ${pack.order.number}, ${pack.workshop.name}`,
  ]) {
    if (at > y + height - 1) break;
    at = paragraph(sheet, line, textX, at, room, { weight: line === label.hand ? 600 : 400 });
  }
  const inside = split + 3;
  sheet.text('inside the closure', inside, y + 5.4, { size: 9 });
  sheet.text(label.mark, inside, y + 14.6, { size: 22, weight: 600 });
  at = y + 19.6;
  for (const line of [
    label.hand,
    label.place,
    `order ${pack.order.number}, revision ${pack.revision.letter}, ${label.number} of ${label.count}`,
  ]) {
    if (at > y + height - 1) break;
    at = paragraph(sheet, line, inside, at, x + width - inside - 2);
  }
}
