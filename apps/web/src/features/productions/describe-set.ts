import type { PieceKind, SetDocument } from '@settlewright/geometry';
import { capital } from '@/lib/capital.ts';
import { numberWord } from '@/lib/number-word.ts';

const KINDS: readonly { kind: PieceKind; one: string; many: string }[] = [
  { kind: 'bench', one: 'bench', many: 'benches' },
  { kind: 'table', one: 'table', many: 'tables' },
  { kind: 'loose-seat', one: 'loose seat', many: 'loose seats' },
  { kind: 'sill', one: 'sill', many: 'sills' },
  { kind: 'overhead', one: 'beam', many: 'beams' },
];

/** What stands in a set, in one sentence: "Four benches, two tables, a sill; six people, 45 checks". */
export function describeSet(document: SetDocument, seated: number, checks: number): string {
  const pieces = KINDS.map(({ kind, one, many }) => {
    const count = document.pieces.filter((piece) => piece.kind === kind).length;
    if (count === 0) return null;
    return count === 1 ? `a ${one}` : `${numberWord(count)} ${many}`;
  }).filter((words) => words !== null);
  if (pieces.length === 0) return 'Nothing on the floor yet';
  const people =
    seated === 0
      ? 'nobody seated yet'
      : `${numberWord(seated)} ${seated === 1 ? 'person' : 'people'}, ${checks} checks`;
  return `${capital(pieces.join(', '))}; ${people}`;
}
