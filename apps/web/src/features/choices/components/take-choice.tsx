import { Button } from '@/components/button.tsx';
import { Measure } from '@/components/measure.tsx';
import type { Effects } from '../effects.ts';
import { ChoiceLines } from './choice-lines.tsx';

interface TakeChoiceProps {
  value: string;
  /** "tables T1 and T2 move along". */
  along: string;
  effects: Effects;
  publicWords: string | undefined;
  onTake: (() => void) | undefined;
}

const NOBODY = 'nobody';

/** Take the suggestion: who gains and who loses, by name, before it is taken. */
export function TakeChoice({ value, along, effects, publicWords, onTake }: TakeChoiceProps) {
  const { better, worse, lost, kept, newly } = effects;
  return (
    <section aria-labelledby="take-heading" className="ruled pt-3 pb-4">
      <h2 id="take-heading" className="mb-1 text-lg font-semibold">
        <Measure text={`Take ${value}`} />
        {along && `, ${along}`}
      </h2>
      <ChoiceLines
        lines={[
          [
            'Better',
            better.length > 0
              ? [better.filter(isBrief).join('; '), ...better.filter((line) => !isBrief(line))].filter(
                  Boolean,
                )
              : [NOBODY],
          ],
          ['Worse', worse.length > 0 ? worse : [NOBODY], worse.length > 0],
          ['Still lost', lost.length > 0 ? [lost.join('; ')] : [NOBODY]],
          ['Public', publicWords ? [publicWords] : []],
          ['The rest', [`${kept} other ${kept === 1 ? 'check keeps its' : 'checks keep their'} verdict`]],
        ]}
      />
      <div className="flex items-center gap-4">
        {onTake && (
          <Button look="main" onClick={onTake} className="shrink-0">
            <span>
              Take <Measure text={value} />
            </span>
          </Button>
        )}
        <ul className="text-sm">
          {newly.map(({ words, names }) => (
            <li key={words}>
              {words}: {names}.
            </li>
          ))}
        </ul>
      </div>
    </section>
  );
}

/** A line without a check in it is about the dimension's own rule. */
const isBrief = (line: string): boolean => !line.includes(': ');
