import type { PieceOf } from '../room/document.ts';
import { formatLength } from '../units/format-length.ts';
import type { LengthStyle } from '../units/length-style.ts';
import { phraseText } from '../units/phrase.ts';
import { HOLD_DOWN_WORDS, type CushionChoice, type CushionEdge } from './cushion-choice.ts';
import type { CushionShape } from './cushion-shape.ts';
import type { CushionSpec } from './cushion-spec.ts';
import type { RunJoints } from './run-joints.ts';
import { CLOSURE_WORDS, CONSTRUCTION_WORDS, WELT_WORDS, type CushionMake } from './making/cushion-make.ts';
import { TUFT_LINE_WORDS, TUFTING_WORDS, type TuftingChoice } from './tufting-choice.ts';
import { allWearPhrase } from './wear.ts';

/**
 * Edges as the sitter sees them.
 *
 * @param kind - of a back the back edge is called the top and the front edge the bottom
 */
export function edgeWords(kind: 'seat' | 'back'): Record<CushionEdge, string> {
  const [back, front] = kind === 'seat' ? ['back', 'front'] : ['top', 'bottom'];
  return { back, front, left: 'sitter’s left', right: 'sitter’s right' };
}

/**
 * A make in words.
 *
 * @param make - of a cushion
 * @param kind - of the cushion
 */
export function makeWords(
  { construction, closure, closureEdge, welt }: CushionMake,
  kind: 'seat' | 'back',
): string {
  const edge = edgeWords(kind)[closureEdge];
  const closed =
    closure === 'stapled' ? CLOSURE_WORDS.stapled : `${CLOSURE_WORDS[closure]} at the ${edge} edge`;
  return `${CONSTRUCTION_WORDS[construction]}, ${closed}, ${WELT_WORDS[welt]}`;
}

/**
 * What the thickness of a cushion is measured between.
 *
 * @param spec - the cushion
 * @param style - units in which lengths are shown
 * @returns a sentence
 */
export function thicknessWords(
  { make, making }: Pick<CushionSpec, 'make' | 'making'>,
  style: LengthStyle,
): string {
  switch (make.construction) {
    case 'boxed':
      return 'Thickness is the boxing between seams.';
    case 'tight-boxed':
      return making
        ? `Thickness is the foam; the boxing between seams is ${formatLength(making.edgeHeightMm, { ...style, feet: false })}.`
        : 'Thickness is the foam.';
    case 'knife-edge':
      return 'Thickness is the foam in the middle.';
    case 'waterfall':
    case 'bullnose':
      return 'Thickness is the sides between seams.';
    case 'plywood-backed':
      return 'Thickness is the foam; the board is under it.';
  }
}

/**
 * How many of a panel are cut: "2 plates", "1 boxing".
 *
 * @param count - of panels alike
 * @param name - of one
 */
export function panelCountWords(count: number, name: string): string {
  if (count === 1) return `1 ${name}`;
  return `${count} ${name.endsWith('half') ? name.replace(/half$/, 'halves') : `${name}s`}`;
}

/**
 * A shape in words.
 *
 * @param shape - of a cushion
 * @param style - units in which lengths are shown
 */
export function shapeWords(shape: CushionShape, style: LengthStyle): string {
  const show = (mm: number) => formatLength(mm, { ...style, feet: false });
  const { frontInMm, notches = [], cornerRadiusMm, drawn } = shape;
  if (drawn) return `drawn with ${drawn.length} corners`;
  const taper = frontInMm
    ? [`front in ${show(frontInMm.left)} at the left and ${show(frontInMm.right)} at the right`]
    : [];
  const cut = notches.length > 0 ? [notches.length === 1 ? 'one notch' : `${notches.length} notches`] : [];
  const round = Object.values(cornerRadiusMm ?? {}).some((radius) => radius > 0) ? ['round corners'] : [];
  const words = [...taper, ...cut, ...round];
  return words.length === 0 ? 'plain rectangle' : words.join(', ');
}

/**
 * Tufting in words.
 *
 * @param tufting - as it was chosen
 * @param style - units in which lengths are shown
 */
export function tuftingWords(tufting: TuftingChoice, style: LengthStyle): string {
  const show = (mm: number) => formatLength(mm, { ...style, feet: false });
  const words = TUFTING_WORDS[tufting.kind];
  if (tufting.kind === 'none' || tufting.kind === 'pull-in') return words;
  const { tuftMm, borderMm, columnsOn } = tufting;
  const size = `${words} about ${show(tuftMm.widthMm)} × ${show(tuftMm.heightMm)}, border ${show(borderMm)}`;
  return columnsOn ? `${size}, ${TUFT_LINE_WORDS[columnsOn]}` : size;
}

/**
 * Joints of the runs of a bench in words.
 *
 * @param joints - of seats and backs, as far as they were chosen
 * @param style - units in which lengths are shown
 */
export function runJointsWords(
  joints: NonNullable<PieceOf<'bench'>['upholstery']['joints']>,
  style: LengthStyle,
): string {
  const show = (mm: number) => formatLength(mm, { ...style, feet: false });
  const said = ([name, one]: readonly [string, RunJoints | undefined]): string[] => {
    if (!one) return [];
    if (one.by === 'board-lines') return [`${name} on board lines`];
    return one.atMm.length === 0 ? [`${name} in one`] : [`${name} at ${one.atMm.map(show).join(', ')}`];
  };
  const words = (
    [
      ['seats', joints.seat],
      ['backs', joints.back],
    ] as const
  ).flatMap(said);
  return words.length === 0 ? 'equal parts' : words.join('; ');
}

/**
 * One thing that was chosen of a cushion, in words.
 *
 * @param choice - with the field in it
 * @param field - which
 * @param kind - of the cushion
 * @param style - units in which lengths are shown
 * @returns `undefined` where it was not chosen
 */
export function cushionChoiceWords(
  choice: CushionChoice,
  field: keyof CushionChoice,
  kind: 'seat' | 'back',
  style: LengthStyle,
): string | undefined {
  const { make, shape, tufting, cameraSides, holdDown, wear, notes } = choice;
  switch (field) {
    case 'make':
      return make && makeWords(make, kind);
    case 'shape':
      return shape && shapeWords(shape, style);
    case 'tufting':
      return tufting && tuftingWords(tufting, style);
    case 'cameraSides':
      return cameraSides && (cameraSides.length === 0 ? 'none' : cameraSides.join(', '));
    case 'holdDown':
      return holdDown && HOLD_DOWN_WORDS[holdDown];
    case 'wear':
      return wear && (wear.length === 0 ? 'none' : phraseText(allWearPhrase(wear, kind), style));
    case 'notes':
      return notes;
  }
}
