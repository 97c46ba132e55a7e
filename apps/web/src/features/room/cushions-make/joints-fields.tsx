import { benchLayout, runJointEnds, type RunJoints } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { Select } from '@/components/select.tsx';
import { TakenLength } from './taken-length.tsx';
import type { Making } from './use-make.ts';

const WAYS = [
  { value: 'equal', words: 'near equal parts' },
  { value: 'board-lines', words: 'on board lines' },
  { value: 'positions', words: 'where I say' },
] as const;
const WORDS = { seat: 'seats', back: 'backs' } as const;

/** Where the run of a bench is divided, seats and backs each their own. */
export function JointsFields({ piece, spec, canEdit, changePiece }: Making) {
  if (piece.kind !== 'bench' || !canEdit) return null;
  const { kind } = spec;
  const { cushionLeftMm: left, cushionRightMm: right } = benchLayout(piece);
  const whole = right - left;
  const chosen = piece.upholstery.joints?.[kind];
  const inner = runJointEnds(piece, kind)
    .slice(1, -1)
    .map((at) => at - left);
  const set = (joints: RunJoints | undefined, words: string) =>
    changePiece((one) => {
      if (one.kind !== 'bench') return one;
      const { joints: old, ...upholstery } = one.upholstery;
      const { [kind]: _, ...others } = old ?? {};
      const next = { ...others, ...(joints && { [kind]: joints }) };
      return {
        ...one,
        upholstery: Object.keys(next).length === 0 ? upholstery : { ...upholstery, joints: next },
      };
    }, `${WORDS[kind]} divided ${words}`);
  const at = chosen?.by === 'positions' ? chosen.atMm : [];
  const place = (atMm: number[], words: string) =>
    set({ by: 'positions', atMm: atMm.sort((a, b) => a - b) }, words);
  return (
    <div className="grid items-start gap-x-6 gap-y-4 phone:grid-cols-2">
      <Select
        label={`The ${WORDS[kind]} of ${piece.mark} are divided`}
        value={chosen?.by ?? 'equal'}
        options={WAYS}
        description={inner.length === 0 ? 'One cushion.' : `${inner.length + 1} cushions.`}
        onChange={(by) => {
          if (by === 'equal') set(undefined, 'in near equal parts');
          else if (by === 'board-lines') set({ by }, 'on board lines');
          else place(inner, 'where I say');
        }}
      />
      {at.map((mm, index) => (
        <div key={`${index} ${mm}`} className="grid">
          <TakenLength
            label={`Joint ${index + 1}, from the left end`}
            description="As seen from in front."
            valueMm={mm}
            minMm={50}
            maxMm={Math.max(50, whole - 50)}
            onTake={(to) =>
              place(
                at.map((one, i) => (i === index ? to : one)),
                `with joint ${index + 1} moved`,
              )
            }
          />
          <span>
            <Button
              look="word"
              onClick={() =>
                place(
                  at.filter((_, i) => i !== index),
                  'with a joint less',
                )
              }
            >
              Take joint {index + 1} out
            </Button>
          </span>
        </div>
      ))}
      {chosen?.by === 'positions' && (
        <span className="self-center">
          <Button
            look="word"
            onClick={() => {
              const ends = [0, ...at, whole];
              const gaps = ends
                .slice(1)
                .map((end, i) => ({ middle: (end + ends[i]!) / 2, long: end - ends[i]! }));
              const longest = gaps.reduce((a, b) => (b.long > a.long ? b : a));
              place([...at, longest.middle], 'with a joint more');
            }}
          >
            Add a joint
          </Button>
        </span>
      )}
    </div>
  );
}
