import { partList } from '../parts/part-list.ts';
import { sentenceOf, type PieceDefinition } from './kind.ts';

/** Beam or soffit: parameters, parts, envelope and sentence. */
export const OVERHEAD: PieceDefinition<'overhead'> = {
  kind: 'overhead',
  letter: 'O',
  title: 'Beam',
  create: (common) => ({
    kind: 'overhead',
    ...common,
    lengthMm: 2438.4,
    depthMm: 152.4,
    thicknessMm: 203.2,
    undersideMm: 1981.2,
  }),
  parameters: [
    { key: 'lengthMm', label: 'Length', kind: 'length', group: 'main', describes: 'end to end of the beam' },
    {
      key: 'undersideMm',
      label: 'Underside',
      kind: 'length',
      group: 'main',
      describes: 'floor to the underside of the beam',
    },
    { key: 'depthMm', label: 'Width', kind: 'length', group: 'main', describes: 'across the beam, level' },
    {
      key: 'thicknessMm',
      label: 'Height',
      kind: 'length',
      group: 'more',
      describes: 'underside to the top of the beam',
    },
  ],
  parts(beam) {
    const list = partList(beam);
    list.box('beam', 'oak', {
      sizeMm: [beam.lengthMm, beam.thicknessMm, beam.depthMm],
      centreMm: [0, beam.undersideMm + beam.thicknessMm / 2, 0],
      grain: 'x',
    });
    return list.parts;
  },
  envelope: (beam) => ({
    minMm: [-beam.lengthMm / 2, beam.undersideMm, -beam.depthMm / 2],
    maxMm: [beam.lengthMm / 2, beam.undersideMm + beam.thicknessMm, beam.depthMm / 2],
  }),
  sentence: (beam) => ({
    main: sentenceOf(
      `Beam ${beam.mark}, `,
      ['lengthMm', 'Length'],
      ' long, ',
      ['depthMm', 'Width'],
      ' wide, underside ',
      ['undersideMm', 'Underside'],
      ' off the floor.',
    ),
    more: sentenceOf('The beam is ', ['thicknessMm', 'Height'], ' high.'),
  }),
};
