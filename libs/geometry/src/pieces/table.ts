import type { PieceOf } from '../room/document.ts';
import { sentenceOf, type Envelope, type PieceDefinition, type SpecSentence } from './kind.ts';
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
  const half = { x: table.lengthMm / 2, z: Math.max(table.widthMm / 2, foot) };
  return { minMm: [-half.x, 0, -half.z], maxMm: [half.x, table.heightMm, half.z] };
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
    ),
  };
}
