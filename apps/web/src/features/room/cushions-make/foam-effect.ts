import {
  REFERENCE_SITTER_KG,
  sinkBand,
  type FitSheet,
  type RuleBook,
  type SinkBand,
  type Verdict,
} from '@settlewright/anthropometry';
import {
  foamSituation,
  isLoss,
  sheetChanges,
  testedOf,
  unpressedSeatTopMm,
  withTested,
  type Foam,
  type SetDocument,
} from '@settlewright/geometry';
import { verdictWord } from '@/components/verdict.tsx';
import { shortName } from '@/lib/short-name.ts';
import type { RoomPicture } from '../picture.ts';
import type { CushionedPiece } from './use-make.ts';

/** Seat of one sitter on a foam: the band is that of the estimator, 90 in 100. */
export interface SeatUnder {
  name: string;
  heightMm: { low: number; best: number; high: number };
  bottomsOut: SinkBand['bottomsOut'];
}

/** What another foam would do, before it is taken. */
export interface FoamEffect {
  before: FitSheet['counts'];
  after: FitSheet['counts'];
  changes: { words: string; worse: boolean }[];
  /** What test sits say of the foam, if there are any. */
  tested: Foam['tested'];
  lightest: SeatUnder;
  heaviest: SeatUnder;
}

/** The piece with another foam under those who sit, or behind them; the deck stays. */
export function withFoam<P extends CushionedPiece>(
  piece: P,
  kind: 'seat' | 'back',
  foam: Foam,
  thicknessMm: number,
): P {
  if (kind === 'back') {
    if (piece.kind !== 'bench') return piece;
    return { ...piece, backCushion: { foam, thicknessMm } };
  }
  const tested = testedOf({ foam, thicknessMm });
  return { ...piece, seatCushion: { foam: withTested(foam, tested), thicknessMm } };
}

/**
 * What a set says once a piece is another: verdicts counted, those that change, and how far the lightest and the heaviest
 * who sit on it go down.
 */
export function foamEffect(
  pieces: { before: SetDocument; after: SetDocument; piece: CushionedPiece },
  check: (document: SetDocument) => FitSheet,
  bodies: RoomPicture['bodies'],
  ruleBook: RuleBook,
): FoamEffect {
  const [was, is] = [check(pieces.before), check(pieces.after)];
  const names = new Map(was.rows.map(({ sitterId, name }) => [sitterId, name]));
  const sitting = bodies
    .filter(({ pieceId, belief }) => pieceId === pieces.piece.id && belief)
    .map(({ name, belief }) => ({ name: shortName(name), weightKg: belief!.weightKg }))
    .sort((a, b) => a.weightKg - b.weightKg);
  const reference = { name: 'the reference sitter', weightKg: REFERENCE_SITTER_KG };
  return {
    before: was.counts,
    after: is.counts,
    changes: sheetChanges(was, is).map((change) => {
      const who = change.sitterId === undefined ? undefined : names.get(change.sitterId);
      const check = ruleBook.rule(change.ruleId).columnName.toLowerCase();
      const about = who === undefined ? change.marks.join(', ') : shortName(who);
      return {
        words: `${about}, ${check}: ${stateWord(change.from)}, then ${stateWord(change.to)}`,
        worse: isLoss(change),
      };
    }),
    tested: testedOf(pieces.piece.seatCushion),
    lightest: seatUnder(pieces.piece, sitting[0] ?? reference),
    heaviest: seatUnder(pieces.piece, sitting.at(-1) ?? reference),
  };
}

const stateWord = (state: Verdict | 'inside' | 'outside' | 'gone'): string =>
  state === 'gone'
    ? 'not asked'
    : state === 'inside' || state === 'outside'
      ? `${state} the clause`
      : verdictWord(state);

function seatUnder(piece: CushionedPiece, { name, weightKg }: { name: string; weightKg: number }): SeatUnder {
  const top = unpressedSeatTopMm(piece);
  const foam = foamSituation(piece.seatCushion);
  if (!foam) return { name, heightMm: { low: top, best: top, high: top }, bottomsOut: 'no' };
  const { lowMm, bestMm, highMm, bottomsOut } = sinkBand(foam, weightKg);
  return { name, heightMm: { low: top - highMm, best: top - bestMm, high: top - lowMm }, bottomsOut };
}
