import { drawButtonSheets } from './button-sheets';
import { drawClothSheets } from './cloth-sheets';
import { drawCushionSheet } from './cushion-sheet';
import { drawLabels } from './label-sheets';
import { OrderPages } from './order-pages';
import { drawOverview } from './overview-sheet';
import { Pack } from './pack';
import type { SpecPack } from './spec-pack';
import { drawTemplates } from './template-sheets';
import { drawFrame, type TitleCell } from './title-block';

/**
 * The paper of a cushion order: the order as a whole, one sheet for each make of cushion, buttons, cloths on their rolls,
 * templates at full size, labels.
 */
export function specPdf(pack: SpecPack): Buffer {
  const pdf = new Pack({
    paper: pack.paper,
    title: `Cushion order ${pack.order.number}, ${pack.order.title}, revision ${pack.revision.letter}`,
    author: pack.workshop.name,
    subject: `${pack.production}, ${pack.set}`,
    issuedAt: pack.revision.issuedAt,
  });
  const pages = new OrderPages(pdf);
  drawOverview(pages, pack);
  for (const cushion of pack.cushions) drawCushionSheet(pages, pack, cushion);
  drawButtonSheets(pages, pack);
  drawClothSheets(pages, pack);
  drawTemplates(pages, pack);
  drawLabels(pages, pack);
  pdf.eachSheet((sheet, number, count) => {
    drawFrame(sheet, titleCells(pack, pages.topicOf(number), number, count));
  });
  return pdf.bytes();
}

function titleCells(pack: SpecPack, topic: readonly string[], number: number, count: number): TitleCell[] {
  const { order, revision, workshop } = pack;
  return [
    { label: 'Production, set', lines: [pack.production, pack.set], widthMm: 47 },
    { label: 'On this sheet', lines: topic, widthMm: 46 },
    { label: 'Workshop', lines: [workshop.name, workshop.telephone].filter(Boolean), widthMm: 37 },
    {
      label: 'For',
      lines: [
        order.upholsterer ?? 'no upholsterer yet',
        `order ${order.number}`,
        order.neededBy ? `needed ${order.neededBy}` : 'no date set',
      ],
    },
    {
      label: 'Issued',
      lines: [revision.issuedOn, revision.issuedBy && `by ${revision.issuedBy}`].filter(Boolean),
      widthMm: 35,
    },
    { label: 'Sheet', lines: [`${number} of ${count}`], widthMm: 20 },
    { label: 'Revision', lines: [revision.letter], widthMm: 18, large: true },
  ];
}
