import type { Answer, Asked, Said } from './person-check.ts';
import type { PlaceTableSituation } from './situation.ts';
import type { Question } from './verdict.ts';

/** Said of a place without a table. */
export const NO_TABLE = { reason: 'no table' };

/** Asks about the table of a place. */
export const withTable = (asked: Asked, ask: (table: PlaceTableSituation) => Question): Said => {
  const { table } = asked.place;
  return table ? [answerOf(table, ask(table))] : NO_TABLE;
};

/** An answer about a table. */
export const answerOf = (table: PlaceTableSituation, asked: Question): Answer => ({
  question: asked,
  pieces: [{ pieceId: table.pieceId, mark: table.mark }],
});
