import { HOLD_DOWN_WORDS } from '../cushions/cushion-choice.ts';
import { buildPhrase } from '../cushions/build-phrase.ts';
import { edgeWords, makeWords } from '../cushions/choice-words.ts';
import type { CushionSpec } from '../cushions/cushion-spec.ts';
import { FULLNESS_RULES } from '../cushions/tufting.ts';
import { TUFT_LINE_WORDS, TUFTING_WORDS } from '../cushions/tufting-choice.ts';
import { allWearPhrase } from '../cushions/wear.ts';
import { isRectangle, outlineStretches, type OutlineCorner } from '../outlines/outline.ts';
import { joined, phrase, type Phrase } from '../units/phrase.ts';

/** What an order says of each of its cushions, in the order of its sheet. */
export const SAID_OF_CUSHION = [
  'width',
  'depth',
  'thickness',
  'make',
  'outline',
  'joints',
  'curve',
  'foam-grade',
  'hand',
  'tufting',
  'button-count',
  'button-places',
  'camera',
  'hold-down',
  'wear',
  'cushion-notes',
] as const;
export type SaidOfCushion = (typeof SAID_OF_CUSHION)[number];

/** A side that is less off square does not show on any paper, millimetres. */
const SQUARE_MM = 0.05;

/**
 * All that an order says of one cushion, to set beside what was said before.
 *
 * @param spec - the cushion
 * @returns a phrase a field, empty where nothing is said
 */
export function saidOfCushion(spec: CushionSpec): Record<SaidOfCushion, Phrase> {
  const { kind, finishedMm, foam, buttons, curve, cameraSides, holdDown, wear = [], notes = '' } = spec;
  const mm = (value: number) => ({ mm: value });
  return {
    width: [mm(finishedMm.widthMm)],
    depth: [mm(finishedMm.depthMm)],
    thickness: [mm(finishedMm.thicknessMm)],
    make: phrase`${makeWords(spec.make, kind)}${spec.faults.length > 0 ? `; NOT as asked: ${spec.faults.join('; ')}` : ''}`,
    outline: outlinePhrase(spec.outline, kind),
    joints: jointsPhrase(spec),
    curve: curve
      ? joined(
          [
            curve.apexMm > 0 ? phrase`fullest ${mm(curve.apexMm)} over the pressed seat` : [],
            curve.recessMm > 0 ? phrase`gives way ${mm(curve.recessMm)} below` : [],
          ],
          '; ',
        )
      : [],
    'foam-grade': joined(
      [
        phrase`${foam.grade}, ${{ densityKgM3: foam.densityKgM3 }}, ${{ firmnessN: foam.ifd25N }} (25 % IFD)`,
        buildPhrase(foam, finishedMm.thicknessMm),
      ],
      '; ',
    ),
    hand: phrase`${spec.hand}`,
    tufting: tuftingPhrase(spec),
    'button-count': phrase`${String(buttons.count)}`,
    'button-places': joined(
      [
        places(
          'across',
          buttons.columns.map(({ fromSeamMm }) => fromSeamMm),
        ),
        places('down', buttons.rowsMm),
      ],
      '; ',
    ),
    camera: phrase`${cameraSides.map((edge) => edgeWords(kind)[edge]).join(', ')}`,
    'hold-down': phrase`${holdDown ? HOLD_DOWN_WORDS[holdDown] : ''}`,
    wear: allWearPhrase(wear, kind),
    'cushion-notes': phrase`${notes}`,
  };
}

function places(way: string, stopsMm: readonly number[]): Phrase {
  if (stopsMm.length === 0) return [];
  return phrase`${way} ${joined(
    stopsMm.map((mm) => ({ mm })),
    ', ',
  )}`;
}

/** Which part of its run a cushion is, and where it begins: both change where a joint moves. */
function jointsPhrase({ kind, place, benchMark, datum }: CushionSpec): Phrase {
  const whole = `${kind} ${place.number} of ${place.of} on ${benchMark}`;
  if (place.of === 1) return phrase`${whole}`;
  const from = datum.meets === 'bench-end' ? 'end of the bench' : datum.meets.replace('-', ' ');
  return phrase`${whole}, its seam ${{ mm: datum.toSeamMm }} from the ${from} at the sitter’s ${datum.side}`;
}

function tuftingPhrase({ tufting: { kind, pullMm, field, fullness } }: CushionSpec): Phrase {
  return joined(
    [
      TUFTING_WORDS[kind],
      pullMm > 0 && kind !== 'none' ? phrase`pulled in ${{ mm: pullMm }}` : [],
      field
        ? phrase`${String(field.across)} × ${String(field.high)} of ${{ mm: field.widthMm }} × ${{ mm: field.heightMm }}, border ${{ mm: field.borderMm }}${field.columnsOn ? ' above and below' : ''}`
        : [],
      field?.columnsOn ? TUFT_LINE_WORDS[field.columnsOn] : [],
      fullness ? FULLNESS_RULES[fullness].words : [],
    ],
    ', ',
  );
}

/** A plain rectangle is said by its sizes alone; of any other outline every edge and radius, round once. */
function outlinePhrase(outline: readonly OutlineCorner[], kind: CushionSpec['kind']): Phrase {
  if (isRectangle(outline, SQUARE_MM)) return phrase`plain rectangle`;
  const names: Readonly<Record<string, string>> = edgeWords(kind);
  return joined(
    outlineStretches(outline).map((stretch) =>
      stretch.kind === 'arc'
        ? phrase`R ${{ mm: stretch.radiusMm }}`
        : phrase`${names[stretch.edge] ?? stretch.edge} ${{ mm: Math.hypot(stretch.to[0] - stretch.from[0], stretch.to[1] - stretch.from[1]) }}`,
    ),
    ', ',
  );
}
