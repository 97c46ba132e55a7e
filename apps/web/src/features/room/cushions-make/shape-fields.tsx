import type { CushionShape } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { DrawnFields } from './drawn-fields.tsx';
import { NotchFields } from './notch-fields.tsx';
import { TakenLength } from './taken-length.tsx';
import type { Making } from './use-make.ts';

const CORNERS = {
  frontRight: 'Front, sitter’s right',
  frontLeft: 'Front, sitter’s left',
  backLeft: 'Back, sitter’s left',
  backRight: 'Back, sitter’s right',
} as const;
const SQUARE = { frontRight: 0, frontLeft: 0, backLeft: 0, backRight: 0 };

/** A shape without what says nothing, or nothing at all. */
function told({ frontInMm, notches, cornerRadiusMm, drawn }: CushionShape): CushionShape | undefined {
  const shape = {
    ...(frontInMm && (frontInMm.left !== 0 || frontInMm.right !== 0) && { frontInMm }),
    ...(notches && notches.length > 0 && { notches }),
    ...(cornerRadiusMm && Object.values(cornerRadiusMm).some((mm) => mm > 0) && { cornerRadiusMm }),
    ...(drawn && { drawn }),
  };
  return Object.keys(shape).length === 0 ? undefined : shape;
}

/** Taper, notches, round corners, or an outline drawn corner by corner. */
export function ShapeFields(making: Making) {
  const { spec, choice, canEdit, choose } = making;
  const shape = choice.shape ?? {};
  const change = (part: CushionShape, words: string) => choose({ shape: told({ ...shape, ...part }) }, words);
  if (!canEdit) return null;
  if (shape.drawn) {
    return (
      <DrawnFields
        corners={shape.drawn}
        onChange={(drawn, words) => (drawn ? change({ drawn }, words) : choose({ shape: undefined }, words))}
      />
    );
  }
  const inset = shape.frontInMm ?? { left: 0, right: 0 };
  const round = shape.cornerRadiusMm ?? SQUARE;
  return (
    <div className="grid gap-4">
      <div className="grid items-start gap-x-6 gap-y-4 phone:grid-cols-2">
        {(['left', 'right'] as const).map((side) => (
          <TakenLength
            key={side}
            label={`Front in at the sitter’s ${side}`}
            description="A taper; as much as the depth is a mitre. Negative: out."
            valueMm={inset[side]}
            minMm={-2000}
            maxMm={2000}
            onTake={(mm) => change({ frontInMm: { ...inset, [side]: mm } }, `front in at the ${side}`)}
          />
        ))}
        {(Object.keys(CORNERS) as (keyof typeof CORNERS)[]).map((corner) => (
          <TakenLength
            key={corner}
            label={`${CORNERS[corner]}: radius`}
            valueMm={round[corner]}
            minMm={0}
            maxMm={1000}
            onTake={(mm) => change({ cornerRadiusMm: { ...round, [corner]: mm } }, 'corner rounded')}
          />
        ))}
      </div>
      <NotchFields notches={shape.notches ?? []} onChange={(notches, words) => change({ notches }, words)} />
      <p>
        <Button
          look="word"
          onClick={() =>
            choose(
              {
                shape: {
                  drawn: spec.outline.map(({ at, radiusMm, edge }) => ({
                    xMm: at[0],
                    yMm: at[1],
                    radiusMm,
                    edge: edge === 'notch' ? 'front' : (edge as 'front'),
                  })),
                },
              },
              'drawn corner by corner',
            )
          }
        >
          Draw it corner by corner instead
        </Button>
      </p>
    </div>
  );
}
