import { drawCushionSheet } from './cushion-sheet';
import { drawOverview } from './overview-sheet';
import { Pack } from './pack';
import type { SpecCushion, SpecPack } from './spec-pack';
import { handWords, marksWords } from './spec-words';
import { drawFrame, type TitleCell } from './title-block';

/** The drawing pack of a cushion order: an overview, then one sheet for each make of cushion. */
export function specPdf(pack: SpecPack): Buffer {
  const pdf = new Pack({
    paper: pack.paper,
    title: `Cushion order ${pack.order.number}, ${pack.order.title}, revision ${pack.revision.letter}`,
    author: pack.workshop.name,
    subject: `${pack.production}, ${pack.set}`,
    issuedAt: pack.revision.issuedAt,
  });
  drawOverview(pdf, pack);
  const opening = pdf.sheetCount;
  for (const cushion of pack.cushions) drawCushionSheet(pdf.addSheet(), pack, cushion);
  pdf.eachSheet((sheet, number, count) => {
    drawFrame(sheet, titleCells(pack, pack.cushions[number - opening - 1], number, count));
  });
  return pdf.bytes();
}

function titleCells(
  pack: SpecPack,
  cushion: SpecCushion | undefined,
  number: number,
  count: number,
): TitleCell[] {
  const { order, revision, workshop } = pack;
  const all = pack.cushions.flatMap(({ marks }) => marks);
  const marks = cushion
    ? [marksWords(cushion.marks), `${cushion.kind}, ${handWords(cushion.hand)}, make ${cushion.marks.length}`]
    : [marksWords(all), all.length === 1 ? 'one cushion' : `${all.length} cushions`];
  return [
    { label: 'Production, set', lines: [pack.production, pack.set], widthMm: 47 },
    { label: 'Marks on this sheet', lines: marks, widthMm: 46 },
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
    { label: 'Sheet', lines: [`${number} of ${count}`], widthMm: 18 },
    { label: 'Revision', lines: [revision.letter], widthMm: 18, large: true },
  ];
}
