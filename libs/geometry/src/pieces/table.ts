import type { PieceOf } from '../room/document.ts';
import { sentenceOf, type Envelope, type PieceDefinition, type SpecSentence } from './kind.ts';
import { LEAF_WORDS, leavesOfTable, tableTop } from './table-leaves.ts';
import { TABLE_PARAMETERS } from './table-parameters.ts';
import { tableParts } from './table-parts.ts';

/** Table: parameters, parts, envelope and sentence. */
export const TABLE: PieceDefinition<'table'> = {
  kind: 'table',
  letter: 'T',
  title: 'Table',
  create: (common) => ({
    kind: 'table',
    ...common,
    lengthMm: 1219.2,
    widthMm: 762,
    heightMm: 736.6,
    topThicknessMm: 31.75,
    edgeLipMm: 0,
    apron: { heightMm: 0, insetMm: 50.8 },
    base: { kind: 'columns', count: 1, diameterMm: 88.9, footLengthMm: 508, footHeightMm: 38.1 },
  }),
  parameters: TABLE_PARAMETERS,
  parts: tableParts,
  envelope,
  sentence,
};

function envelope(table: PieceOf<'table'>): Envelope {
  const { base } = table;
  const foot = base.kind === 'columns' ? base.footLengthMm / 2 : 0;
  const { x0, x1, z0, z1 } = tableTop(table);
  return { minMm: [x0, 0, Math.min(z0, -foot)], maxMm: [x1, table.heightMm, Math.max(z1, foot)] };
}

function sentence(table: PieceOf<'table'>): SpecSentence {
  const base =
    table.base.kind === 'columns'
      ? ` on ${table.base.count === 1 ? 'one column' : 'two columns'}`
      : table.base.kind === 'legs'
        ? ' on legs'
        : ' on trestles';
  return {
    main: sentenceOf(
      `Table ${table.mark}, `,
      ['lengthMm', 'Length'],
      ' long, ',
      ['widthMm', 'Width'],
      ' wide, top ',
      ['heightMm', 'Table height'],
      ' off the floor.',
    ),
    more: sentenceOf(
      'Top ',
      ['topThicknessMm', 'Top thickness'],
      ` thick${base}, `,
      ...(table.apron.heightMm > 0
        ? ([
            'apron ',
            ['apron.heightMm', 'Apron height'],
            ' deep set in ',
            ['apron.insetMm', 'Apron inset'],
            '.',
          ] as const)
        : (['no apron.'] as const)),
      ...leafRuns(table),
    ),
  };
}

type Run = Parameters<typeof sentenceOf>[number];

/** " Left leaf 10″ wide, up; right leaf 10″ wide, hanging; making 4′ 10″ long in all as they are." */
function leafRuns(table: PieceOf<'table'>): Run[] {
  const leaves = leavesOfTable(table);
  if (leaves.length === 0) return [];
  const { x0, x1, z0, z1 } = tableTop(table);
  const atEnds = leaves.some(({ edge }) => edge === 'left' || edge === 'right');
  return [
    ...leaves.flatMap(({ edge, down }, n): Run[] => {
      const words = LEAF_WORDS[edge];
      const name = n === 0 ? words.replace(/^./, (letter) => letter.toUpperCase()) : words;
      return [
        ` ${name} `,
        [`leaves.${edge}.widthMm`, `${words.replace(/^./, (letter) => letter.toUpperCase())} width`],
        ` wide, ${down ? 'hanging' : 'up'};`,
      ];
    }),
    ' ',
    {
      kind: 'derived',
      key: atEnds ? 'wholeLengthMm' : 'wholeWidthMm',
      text: `making ${atEnds ? 'long' : 'wide'} in all as they are`,
      valueMm: atEnds ? x1 - x0 : z1 - z0,
    },
    '.',
  ];
}
