import type { Part, Vec3 } from '../parts/part.ts';
import type { PieceKind, PieceOf, SetDocument } from '../room/document.ts';

/** A dimension or choice of a piece, ready to be shown and edited. */
export interface Parameter {
  /** Path in the piece, or the name of a derived dimension such as `pressedSeatHeight`. */
  key: string;
  label: string;
  kind: 'length' | 'angle' | 'count' | 'choice';
  unit: 'mm' | 'deg' | 'N' | 'kg/m³' | '';
  /** Limits in the unit; 0 for a choice. */
  min: number;
  max: number;
  choices?: readonly { value: string; label: string }[];
  value: number | string;
  group: 'main' | 'more';
  /** From where to where it is measured. */
  describes: string;
}

/** How a kind of piece declares one of its parameters. Limits come from the document schema unless given. */
export interface ParameterSpec<K extends PieceKind> {
  key: string;
  label: string;
  kind: Parameter['kind'];
  unit?: Parameter['unit'];
  group: Parameter['group'];
  describes: string;
  choices?: Parameter['choices'];
  /** Left out for pieces that have no such dimension. */
  applies?: (piece: PieceOf<K>) => boolean;
  /** For a derived dimension; a stored one is read at its path. */
  read?: (piece: PieceOf<K>) => number | string;
  write?: (piece: PieceOf<K>, value: number | string) => PieceOf<K>;
  limits?: (piece: PieceOf<K>) => { min?: number; max?: number };
}

/** One run of a spec sentence. */
export type SpecToken =
  | { kind: 'text'; text: string }
  | { kind: 'number'; key: string; label: string }
  | { kind: 'derived'; key: string; text: string; valueMm?: number };

/** The two sentences that say a piece. */
export interface SpecSentence {
  main: SpecToken[];
  more: SpecToken[];
}

/** The box a piece fills, in its own frame. */
export interface Envelope {
  minMm: Vec3;
  maxMm: Vec3;
}

/** What a piece starts from. */
type CommonFields = Pick<PieceOf<'bench'>, 'id' | 'mark' | 'name' | 'at' | 'accessible' | 'locked' | 'note'>;

/** Everything the library knows about one kind of piece. */
export interface PieceDefinition<K extends PieceKind> {
  kind: K;
  /** Letter of its marks. */
  letter: string;
  title: string;
  create(common: CommonFields): PieceOf<K>;
  parameters: readonly ParameterSpec<K>[];
  parts(piece: PieceOf<K>, document?: SetDocument): Part[];
  envelope(piece: PieceOf<K>): Envelope;
  sentence(piece: PieceOf<K>): SpecSentence;
}

/**
 * Writes a sentence: strings are text, `[key, label]` pairs are numbers to edit.
 *
 * @param runs - the runs in reading order
 * @returns the tokens
 */
export function sentenceOf(...runs: (string | readonly [string, string] | SpecToken)[]): SpecToken[] {
  return runs.map((run) => {
    if (typeof run === 'string') return { kind: 'text', text: run };
    if (isPair(run)) return { kind: 'number', key: run[0], label: run[1] };
    return run;
  });
}

function isPair(run: readonly [string, string] | SpecToken): run is readonly [string, string] {
  return Array.isArray(run);
}
