import {
  FULLNESS_RULES,
  TUFT_LINE_WORDS,
  TUFTING_WORDS,
  type FullnessRule,
  type TuftingChoice,
  type TuftLinesOf,
} from '@settlewright/geometry';
import { Select } from '@/components/select.tsx';
import { TakenLength } from './taken-length.tsx';
import type { Making } from './use-make.ts';

type Kind = TuftingChoice['kind'];

const AS_BENCH = 'as-the-bench';
const FILL = 'fill';
const FILL_WORDS = 'columns fill the face';
const RULES = (Object.keys(FULLNESS_RULES) as FullnessRule[]).map((value) => ({
  value,
  words: FULLNESS_RULES[value].words,
}));

/** What a kind begins with: 4 x 6 in diamonds or 5 in squares in a border of 3 in. */
function firstOf(kind: Kind): TuftingChoice {
  if (kind === 'none' || kind === 'pull-in') return { kind };
  const tuftMm = kind === 'diamond' ? { widthMm: 101.6, heightMm: 152.4 } : { widthMm: 127, heightMm: 127 };
  return { kind, tuftMm, borderMm: 76.2, fullness: 'foam-thickness' };
}

/** Buttons and tufts of a cushion; where buttons stand on board lines is chosen with the bench. */
export function TuftingFields({ spec, piece, choice, canEdit, choose }: Making) {
  const chosen = choice.tufting;
  const isField = chosen?.kind === 'diamond' || chosen?.kind === 'biscuit';
  const { field } = spec.tufting;
  return (
    <div className="grid items-start gap-x-6 gap-y-4 phone:grid-cols-2">
      <Select<Kind | typeof AS_BENCH>
        label="Tufting"
        value={chosen?.kind ?? AS_BENCH}
        options={[
          { value: AS_BENCH, words: 'as the bench says' },
          ...(Object.keys(TUFTING_WORDS) as Kind[]).map((value) => ({ value, words: TUFTING_WORDS[value] })),
        ]}
        onChange={(kind) =>
          kind === AS_BENCH
            ? choose({ tufting: undefined }, 'buttons as the bench says')
            : choose({ tufting: firstOf(kind) }, TUFTING_WORDS[kind])
        }
        description={
          field
            ? `${field.across} across and ${field.high} high; ${spec.buttons.count} buttons.`
            : `${spec.buttons.count} buttons.`
        }
        disabled={!canEdit}
      />
      {isField && canEdit && (
        <>
          <Select
            label="Fullness of the cloth"
            value={chosen.fullness}
            options={RULES}
            onChange={(fullness) => choose({ tufting: { ...chosen, fullness } }, 'fullness of the cloth')}
          />
          {piece.kind === 'bench' && (
            <Select<TuftLinesOf | typeof FILL>
              label="Columns"
              value={chosen.columnsOn ?? FILL}
              options={[
                { value: FILL, words: FILL_WORDS },
                ...(Object.keys(TUFT_LINE_WORDS) as TuftLinesOf[]).map((value) => ({
                  value,
                  words: TUFT_LINE_WORDS[value],
                })),
              ]}
              onChange={(to) => {
                const { columnsOn: _, ...others } = chosen;
                if (to === FILL) choose({ tufting: others }, FILL_WORDS);
                else choose({ tufting: { ...others, columnsOn: to } }, TUFT_LINE_WORDS[to]);
              }}
            />
          )}
          <TakenLength
            label="Width of one, about"
            valueMm={chosen.tuftMm.widthMm}
            minMm={20}
            maxMm={1000}
            onTake={(widthMm) =>
              choose({ tufting: { ...chosen, tuftMm: { ...chosen.tuftMm, widthMm } } }, 'width of a tuft')
            }
          />
          <TakenLength
            label="Height of one, about"
            valueMm={chosen.tuftMm.heightMm}
            minMm={20}
            maxMm={1000}
            onTake={(heightMm) =>
              choose({ tufting: { ...chosen, tuftMm: { ...chosen.tuftMm, heightMm } } }, 'height of a tuft')
            }
          />
          <TakenLength
            label="Border"
            valueMm={chosen.borderMm}
            minMm={0}
            maxMm={500}
            onTake={(borderMm) => choose({ tufting: { ...chosen, borderMm } }, 'border round the tufts')}
          />
        </>
      )}
      {chosen && chosen.kind !== 'none' && canEdit && (
        <TakenLength
          label="Buttons go in by"
          valueMm={spec.tufting.pullMm}
          minMm={1}
          maxMm={250}
          onTake={(pullMm) => choose({ tufting: { ...chosen, pullMm } }, 'depth of the buttons')}
        />
      )}
    </div>
  );
}
