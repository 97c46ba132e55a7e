import { nothing, type PieceAnswer, type PieceAsked } from './piece-check.ts';
import type { BenchSituation } from './situation.ts';

/** Asks every bench; a bench without places has nobody to ask for. */
export const eachBench =
  (ask: (bench: BenchSituation, asked: PieceAsked) => PieceAnswer['said']) =>
  (asked: PieceAsked): PieceAnswer[] => {
    const { benches } = asked.situation;
    if (benches.length === 0) return nothing('no bench');
    return benches.map((bench) => ({
      pieceIds: [bench.pieceId],
      marks: [bench.mark],
      said: ask(bench, asked),
    }));
  };

/** Said of a bench that nobody can sit on. */
export const NO_PLACES = { kind: 'doesNotApply', reason: 'no place on the bench' } as const;
