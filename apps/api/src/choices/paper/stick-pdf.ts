import { Flow } from '../../fit-checks/paper/flow';
import { titleCells } from '../../fit-checks/paper/fit-sheet-pdf';
import { Pack } from '../../paper/pack';
import { drawFrame } from '../../paper/title-block';
import { drawBoard } from './stick-board';
import type { StickPaper } from './stick-paper';
import { drawHeading, drawWords } from './stick-words';

/** A story stick on paper: black on white and told by shape, so that a copy of a copy still says who fits where. */
export function stickPdf(input: StickPaper): Buffer {
  const { state, productionName, setName, stick } = input;
  const version = state.kind === 'revision' ? `revision ${state.letter}` : `draft ${state.number}`;
  const pack = new Pack({
    paper: input.paper,
    title: `${productionName}, ${setName}: story stick of ${stick.dimension.label}, ${version}`,
    author: input.workshop.name,
    subject: 'Story stick',
    issuedAt: input.at,
  });
  const flow = new Flow(pack);
  drawHeading(flow, input);
  drawBoard(flow, input);
  drawWords(flow, input);
  pack.eachSheet((sheet, number, count) => drawFrame(sheet, titleCells(input, number, count)));
  return pack.bytes();
}
