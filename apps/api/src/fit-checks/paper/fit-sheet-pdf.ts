import type { LengthStyle } from '@settlewright/geometry';
import { Pack } from '../../paper/pack';
import { drawFrame, type TitleCell } from '../../paper/title-block';
import type { FitSheetPaper } from './fit-sheet-paper';
import { drawAtOdds } from './at-odds';
import { drawGrid } from './grid';
import { drawHeading } from './heading';
import { Flow } from './flow';
import { drawPieces } from './pieces';
import { drawSources } from './sources';

/** The fit sheet on paper: black on white, so that a copy of a copy still tells the verdicts apart. */
export function fitSheetPdf(input: FitSheetPaper): Buffer {
  const { state, productionName, setName } = input;
  const title =
    state.kind === 'revision'
      ? `${productionName}, ${setName}: fit sheet of revision ${state.letter}`
      : `${productionName}, ${setName}: fit sheet of draft ${state.number}`;
  const pack = new Pack({
    paper: input.paper,
    title,
    author: input.workshop.name,
    subject: 'Fit sheet',
    issuedAt: input.at,
  });
  const flow = new Flow(pack);
  drawHeading(flow, input);
  drawGrid(flow, input);
  drawPieces(flow, input);
  drawAtOdds(flow, input);
  drawSources(flow, input);
  pack.eachSheet((sheet, number, count) => drawFrame(sheet, titleCells(input, number, count)));
  return pack.bytes();
}

/** The title block of a sheet of verdicts: of what, whose, in which units, and which version. */
export function titleCells(
  input: Omit<FitSheetPaper, 'sheet' | 'ruleBook' | 'confidence' | 'paper'>,
  number: number,
  count: number,
): TitleCell[] {
  const { state, workshop, style, timeZone } = input;
  const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone }).format(input.at);
  const issued = state.kind === 'revision';
  return [
    { label: 'Production, set', lines: [input.productionName, input.setName] },
    {
      label: 'Workshop',
      lines: [workshop.name, ...(workshop.telephone ? [workshop.telephone] : [])],
      widthMm: 54,
    },
    { label: 'Lengths in', lines: UNIT_LINES[style.system](style.roundTo), widthMm: 34 },
    {
      label: issued ? 'Issued' : 'Saved',
      lines: [day, ...(input.by ? [`by ${input.by}`] : [])],
      widthMm: 50,
    },
    { label: 'Sheet', lines: [`${number} of ${count}`], widthMm: 20 },
    issued
      ? { label: 'Revision', lines: [state.letter], widthMm: 22, large: true }
      : { label: 'Draft', lines: [String(state.number)], widthMm: 22, large: true },
  ];
}

const UNIT_LINES: Record<LengthStyle['system'], (roundTo: number) => string[]> = {
  'feet-inches': (n) => ['feet and inches', `to 1/${n} inch`],
  'decimal-inches': () => ['inches, decimal'],
  millimetres: () => ['millimetres'],
};
