import type { FitSheet, RuleBook, VerdictOutcome } from '@settlewright/anthropometry';
import {
  cushionChoiceWords,
  formatLength,
  LEAF_WORDS,
  lensWords,
  parametersOf,
  runJointsWords,
  type CushionChoice,
  type DocumentDifference,
  type LengthStyle,
  type NamedView,
  type PieceGroup,
  type PieceOf,
  type SetDocument,
  type SitterRef,
} from '@settlewright/geometry';
import type { CastMember } from '@/lib/contract.ts';
import { joinWords } from '../choosing-words.ts';
import { showNumber } from '../numbers.ts';
import { sitterName } from '../sitters.ts';
import { shortName } from '@/lib/short-name.ts';

export type Side = 'mine' | 'theirs';

/** Stored values that the sentence says by a derived number: the deck follows from the seat height. */
const SAID_AS: Partial<Record<string, { key: string; label: string }>> = {
  deckHeightMm: { key: 'pressedSeatHeight', label: 'Seat height' },
};

export function nameOf({ mark, label: own, key = '', kind }: DocumentDifference): string {
  const label = kind === 'parameter' ? (SAID_AS[key]?.label ?? own) : own;
  if (kind === 'piece') return label;
  return mark && !label.includes(mark) ? `${mark}, ${label.charAt(0).toLowerCase()}${label.slice(1)}` : label;
}

export interface WordsOf {
  style: LengthStyle;
  cast: readonly CastMember[];
  documents: Record<Side | 'base', SetDocument>;
}

function isSitter(value: unknown): value is SitterRef {
  return typeof value === 'object' && value !== null && 'kind' in value;
}

type TableLeaves = NonNullable<PieceOf<'table'>['leaves']>;

/** "left leaf 10″, hanging and right leaf 10″, up". */
function sayLeaves(leaves: TableLeaves, style: LengthStyle): string {
  const each = (['left', 'right', 'front', 'back'] as const).flatMap((edge) => {
    const leaf = leaves[edge];
    return leaf
      ? [`${LEAF_WORDS[edge]} ${formatLength(leaf.widthMm, style)} ${leaf.down ? 'hanging' : 'up'}`]
      : [];
  });
  return joinWords(each);
}

const sayJoints = (value: unknown, style: LengthStyle): string =>
  runJointsWords(value as NonNullable<PieceOf<'bench'>['upholstery']['joints']>, style);

function sayChosen({ id, key = '' }: DocumentDifference, value: unknown, style: LengthStyle): string {
  const field = key as keyof CushionChoice;
  return cushionChoiceWords({ [field]: value }, field, id.includes('/back-') ? 'back' : 'seat', style) ?? '';
}

/** One side of a difference as a person reads it. */
export function sayValue(difference: DocumentDifference, side: Side | 'base', words: WordsOf): string {
  const { kind, key = '', pieceId } = difference;
  const value = difference[side];
  if (value === undefined || value === null) {
    if (kind === 'cushion') return 'as usual';
    if (kind !== 'seating') return 'none';
    return key === 'posture' ? 'as the place suggests' : 'nobody';
  }
  if (kind === 'piece') return 'kept';
  if (kind === 'known-difference') return (value as SetDocument['knownDifferences'][number]).text;
  if (kind === 'group') {
    const { pieceIds } = value as PieceGroup;
    const { pieces } = words.documents[side];
    return joinWords(pieces.filter(({ id }) => pieceIds.includes(id)).map(({ mark }) => mark));
  }
  if (kind === 'dimension') return 'pinned';
  if (kind === 'cushion') return sayChosen(difference, value, words.style);
  if (key === 'leaves') return sayLeaves(value, words.style);
  if (kind === 'view') {
    const { name, camera } = value as NamedView;
    return camera.kind === 'lens'
      ? `${name}, ${lensWords(camera, words.style)}`
      : `${name}, view ${camera.letter}`;
  }
  if (kind === 'seating' && isSitter(value)) return sitterName(value, words.cast);
  if (key === 'at' && typeof value === 'object') return 'moved';
  if (key === 'upholstery.joints') return sayJoints(value, words.style);
  const piece = words.documents[side].pieces.find((candidate) => candidate.id === pieceId);
  const said = SAID_AS[key]?.key ?? key;
  const parameter = piece && parametersOf(piece).find((candidate) => candidate.key === said);
  if (parameter && typeof parameter.value === 'number') {
    return showNumber({ ...parameter, value: parameter.value }, words.style);
  }
  const choice = parameter?.choices?.find((candidate) => candidate.value === value);
  if (choice) return choice.label;
  if (typeof value === 'number' && key.endsWith('Mm')) {
    return showNumber({ key, label: '', kind: 'length', unit: 'mm', min: 0, max: 1e5, value }, words.style);
  }
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'string') return value === '' ? 'empty' : value;
  return typeof value === 'number' ? String(value) : 'changed';
}

export interface AffectedVerdict {
  key: string;
  who: string;
  check: string;
  outcome: VerdictOutcome;
}

/** Verdicts that a choice decides: those that differ between two versions of the sheet. */
export function affectedVerdicts(
  sheet: FitSheet,
  other: FitSheet,
  ruleBook: RuleBook,
  most: number,
): AffectedVerdict[] {
  const others = new Map(
    other.rows.flatMap((row) => row.cells.map((cell) => [`${row.sitterId} ${cell.ruleId}`, cell.outcome])),
  );
  return sheet.rows
    .flatMap((row) =>
      row.cells.flatMap((cell): AffectedVerdict[] => {
        const key = `${row.sitterId} ${cell.ruleId}`;
        const twin = others.get(key);
        const { outcome } = cell;
        if (outcome.kind !== 'verdict') return [];
        if (twin?.kind === 'verdict' && Math.abs(twin.margin - outcome.margin) < 0.05) return [];
        const check = ruleBook.rule(cell.ruleId).columnName.toLowerCase();
        return [{ key, who: shortName(row.name), check, outcome }];
      }),
    )
    .sort((a, b) => a.outcome.margin - b.outcome.margin)
    .slice(0, most);
}
