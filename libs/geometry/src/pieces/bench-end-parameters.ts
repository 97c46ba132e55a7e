import type { PieceOf } from '../room/document.ts';
import type { ParameterSpec } from './kind.ts';

type Bench = PieceOf<'bench'>;

/** What is left between the ends of a bench at the least, millimetres. */
export const THINNEST_INNER_MM = 250;

const END_KINDS = [
  { value: 'open', label: 'open' },
  { value: 'arm', label: 'arm' },
  { value: 'wall', label: 'end wall' },
] as const;

/** What the ends of a bench take of its length, millimetres. */
export function endsMm(bench: Bench): number {
  return bench.ends.left.thicknessMm + bench.ends.right.thicknessMm;
}

/** Dimensions and choices of one end of a bench, in the order of the form. */
export function endParameters(side: 'left' | 'right'): ParameterSpec<'bench'>[] {
  const hand = `${side === 'left' ? 'Left' : 'Right'} end`;
  return [
    {
      key: `ends.${side}.kind`,
      label: hand,
      kind: 'choice',
      group: 'more',
      describes: `what closes the ${side} end, as seen from in front`,
      choices: END_KINDS,
    },
    {
      key: `ends.${side}.thicknessMm`,
      label: `${hand} thickness`,
      kind: 'length',
      group: 'more',
      describes: 'thickness of the arm, wall or moulding',
      limits: (bench) => ({
        max: Math.max(
          0,
          Math.min(200, bench.lengthMm - THINNEST_INNER_MM - endsMm(bench) + bench.ends[side].thicknessMm),
        ),
      }),
    },
    {
      key: `ends.${side}.heightMm`,
      label: `${hand} height`,
      kind: 'length',
      group: 'more',
      describes: 'pressed seat to the top of the arm or wall',
      applies: (bench) => bench.ends[side].kind !== 'open',
    },
  ];
}
