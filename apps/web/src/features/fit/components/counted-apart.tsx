import type { FitCell } from '@settlewright/anthropometry';
import { verdictWord } from '@/components/verdict.tsx';
import { useFitView } from '../fit-view.ts';

const TROUBLE = ['wontFit', 'tight'] as const;

function troubleWords(cells: readonly FitCell[]): string {
  return TROUBLE.map((verdict) => {
    const count = cells.filter(
      ({ outcome }) => outcome.kind === 'verdict' && outcome.verdict === verdict,
    ).length;
    return count === 0 ? '' : `${count} ${verdictWord(verdict)}`;
  })
    .filter(Boolean)
    .join(', ');
}

/** What the counts leave out, since they are of sitters alone: "The public: 3 won’t fit." */
export function CountedApart({ className }: { className?: string }) {
  const { sheet } = useFitView();
  const lines = [
    { name: 'The public', words: troubleWords(sheet.publicRow.cells) },
    { name: 'Pieces and ways', words: troubleWords(sheet.piecesAndWays) },
  ].filter(({ words }) => words !== '');
  if (lines.length === 0) return null;
  return <p className={className}>{lines.map(({ name, words }) => `${name}: ${words}.`).join(' ')}</p>;
}
