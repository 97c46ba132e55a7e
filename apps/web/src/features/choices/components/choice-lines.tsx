import { classNames } from '@/components/class-names.ts';
import { Sentence } from './sentence.tsx';

type Line = readonly [name: string, says: readonly string[], bad?: boolean];

/** What a choice does, line by line. */
export function ChoiceLines({ lines }: { lines: readonly Line[] }) {
  return (
    <dl className="mb-3 text-sm leading-5">
      {lines
        .filter(([, says]) => says.length > 0)
        .map(([name, says, bad]) => (
          <div key={name} className="grid grid-cols-[4.75rem_1fr] border-b border-rule py-1.5">
            <dt className="text-ink-3">{name}</dt>
            <dd className={classNames(bad && 'text-wont')}>
              {says.map((words) => (
                <span key={words} className="block">
                  <Sentence text={words} />
                </span>
              ))}
            </dd>
          </div>
        ))}
    </dl>
  );
}
