import {
  normalQuantile,
  Z90,
  type FitSheet,
  type LimitLines,
  type Verdict,
  type VerdictOutcome,
} from '@settlewright/anthropometry';
import { pressedSeatHeightMm } from '../pieces/seat-sink.ts';
import type { SetDocument } from '../room/document.ts';

/** The pressed seat heights that suit one sitter of a bench. */
export interface SeatHeightBand {
  sitterId: string;
  placeId: string;
  name: string;
  verdict: Verdict;
  /** How far both are drawn in, since the cushion may go down less or more, millimetres; 0 without a cushion. */
  drawnInMm: number;
  /** Where the sitter fits, as pressed seat height under the reference sitter. */
  fits: LimitLines;
  /** Where the sitter is at least tight. */
  tight: LimitLines;
  /** Best values: of somebody who was not measured, or of how far the cushion goes down where that decides. */
  estimated: boolean;
}

/** What a bench's sitters need of its seat height. */
export interface SeatHeightNeeds {
  bands: SeatHeightBand[];
  /** Heights at which every sitter fits; `undefined` when there are none. */
  common: { lowerMm: number; upperMm: number } | undefined;
}

const RULE = 'SEAT-02';

/**
 * The seat heights that the sitters of one bench need, read off the sheet's own lines.
 *
 * Each sitter sinks by an own amount, so a limit is carried over as the difference from where that sitter's seat
 * is now to the pressed seat height under the reference sitter. Lines are drawn in by what is not known of how far the
 * cushion goes down, with the probability that the sheet's verdicts ask for.
 *
 * @param document - the set
 * @param sheet - its fit sheet, with full detail
 * @param pieceId - bench or loose seat
 * @returns one band a sitter, in order of place, and what they have in common; millimetres above the floor
 * @source limits of rule SEAT-02 in the rule data
 */
export function seatHeightNeeds(document: SetDocument, sheet: FitSheet, pieceId: string): SeatHeightNeeds {
  const piece = document.pieces.find((candidate) => candidate.id === pieceId);
  if (piece?.kind !== 'bench' && piece?.kind !== 'loose-seat') return { bands: [], common: undefined };
  const pressed = pressedSeatHeightMm(piece);
  const bands = sheet.rows
    .filter((row) => row.placeId.startsWith(`${pieceId}:`))
    .flatMap((row): SeatHeightBand[] => {
      const outcome = row.cells.find((cell) => cell.ruleId === RULE)?.outcome;
      if (outcome?.kind !== 'verdict') return [];
      const drawnInMm = doubtOf(outcome, sheet.confidence);
      const carried = ({ lower, upper }: LimitLines): LimitLines => ({
        ...(lower === undefined ? {} : { lower: pressed + lower - outcome.value + drawnInMm }),
        ...(upper === undefined ? {} : { upper: pressed + upper - outcome.value - drawnInMm }),
      });
      const { sitterId, placeId, name } = row;
      const { verdict, estimated, pass, fail } = outcome;
      const lines = { fits: carried(pass), tight: carried(fail) };
      return [{ sitterId, placeId, name, verdict, estimated, drawnInMm, ...lines }];
    });
  const lowerMm = Math.max(...bands.map(({ fits }) => fits.lower ?? 0));
  const upperMm = Math.min(...bands.map(({ fits }) => fits.upper ?? Infinity));
  const met = bands.length > 0 && lowerMm <= upperMm;
  return { bands, common: met ? { lowerMm, upperMm } : undefined };
}

/** How far from a line the best drop has to stay for the verdict to be as sure as asked. */
function doubtOf({ drops = [] }: VerdictOutcome, confidence: number): number {
  const ends = drops.map(({ error, bestMm }) => error * bestMm);
  return (normalQuantile(confidence) / Z90) * Math.hypot(...ends);
}
