import type { ReactNode } from 'react';
import { Button } from '@/components/button.tsx';
import { Measure } from '@/components/measure.tsx';
import type { Effects } from '../effects.ts';
import { ChoiceLines } from './choice-lines.tsx';

interface TakeChoiceProps {
  value: string;
  /** "tables T1 and T2 move along". */
  along: string;
  /** Whom the value serves, in one sentence. */
  serves: string | undefined;
  effects: Effects;
  publicWords: string | undefined;
  onTake: (() => void) | undefined;
  /** Another way out, beside the button. */
  children?: ReactNode;
}

const NOBODY = 'nobody';

/** Take another value: who gains and who loses, by name, before it is taken. */
export function TakeChoice({
  value,
  along,
  serves,
  effects,
  publicWords,
  onTake,
  children,
}: TakeChoiceProps) {
  const { better, worse, lost, unknown, kept, newly } = effects;
  return (
    <section aria-labelledby="take-heading" className="ruled pt-3 pb-4">
      <h2 id="take-heading" className="mb-1 text-lg font-semibold">
        <Measure text={`Take ${value}`} />
        {along && `, ${along}`}
      </h2>
      {serves && <p className="mb-2 text-sm text-ink-2">{serves}</p>}
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
          ['Still lost', lost.length > 0 ? lost : [NOBODY]],
          ['Not known', unknown],
          ['Public', publicWords ? [publicWords] : []],
          ['The rest', [`${kept} other ${kept === 1 ? 'check keeps its' : 'checks keep their'} verdict`]],
        ]}
      />
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        {onTake && (
          <Button look="main" onClick={onTake} className="shrink-0">
            <span>
              Take <Measure text={value} />
            </span>
          </Button>
        )}
        {children}
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
