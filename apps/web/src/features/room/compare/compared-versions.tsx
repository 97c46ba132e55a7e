import { compareSheets, diffDocuments, type ComparedCell } from '@settlewright/geometry';
import type { RuleBook } from '@settlewright/anthropometry';
import { useMemo, type ReactNode } from 'react';
import { Measure } from '@/components/measure.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { VerdictCounts } from '@/components/verdict.tsx';
import type { CastMember } from '@/lib/contract.ts';
import { useUnitStyle } from '@/lib/unit-choice.ts';
import { nameOf, sayValue, type WordsOf } from '../components/conflict-words.ts';
import { ComparedChanges, changeCount } from './compared-changes.tsx';
import type { Version } from './use-version.ts';

interface Props {
  before: Version;
  after: Version;
  cast: readonly CastMember[];
  ruleBook: RuleBook;
}

/** What changed between two versions, and for whom. */
export function ComparedVersions({ before, after, cast, ruleBook }: Props) {
  const style = useUnitStyle();
  const differences = useMemo(
    () => diffDocuments(before.document, before.document, after.document),
    [before.document, after.document],
  );
  const sheets = useMemo(() => compareSheets(before.sheet, after.sheet), [before.sheet, after.sheet]);
  const words: WordsOf = {
    style,
    cast,
    documents: { mine: before.document, theirs: after.document, base: before.document },
  };
  const list = (cells: ComparedCell[], withMarks = false) => (
    <ComparedChanges cells={cells} ruleBook={ruleBook} style={style} withMarks={withMarks} />
  );
  const gained = sheets.sitters.filter(({ gains }) => gains.length > 0);
  const lost = sheets.sitters.filter(({ losses }) => losses.length > 0);
  const nobody = <p className="text-ink-2">Nobody.</p>;
  return (
    <>
      <div className="grid gap-x-10 gap-y-4 tablet:grid-cols-2">
        {[before, after].map(({ words: name, sheet }) => (
          <section key={name} aria-label={name}>
            <RuleHeading>{name}</RuleHeading>
            <VerdictCounts counts={sheet.counts} />
          </section>
        ))}
      </div>
      {sheets.joined.length + sheets.left.length > 0 && (
        <p className="mt-4 text-ink-2">
          {sheets.joined.length > 0 && `Only in ${after.words}: ${sheets.joined.join(', ')}. `}
          {sheets.left.length > 0 && `Only in ${before.words}: ${sheets.left.join(', ')}.`}
        </p>
      )}
      <section className="mt-8" aria-label="What changed">
        <RuleHeading aside={<span className="text-sm text-ink-2">{differences.length}</span>}>
          What changed
        </RuleHeading>
        {differences.length === 0 ? (
          <p className="text-ink-2">
            Nothing: both hold the same set. Verdicts may differ with what is known of people.
          </p>
        ) : (
          <table className="w-full text-left">
            <thead className="sr-only">
              <tr>
                <th scope="col">What</th>
                <th scope="col">{before.words}</th>
                <th scope="col">{after.words}</th>
              </tr>
            </thead>
            <tbody>
              {differences.map((difference) => (
                <tr key={difference.id} className="border-b border-rule align-baseline">
                  <th scope="row" className="py-2 pr-4 font-medium">
                    {nameOf(difference)}
                  </th>
                  <td className="w-1/4 py-2 pr-4 text-ink-2">
                    <Measure text={sayValue(difference, 'mine', words)} />
                  </td>
                  <td className="w-1/4 py-2 font-semibold">
                    <Measure text={sayValue(difference, 'theirs', words)} />
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        )}
      </section>
      <div className="mt-8 grid gap-x-10 gap-y-8 tablet:grid-cols-2">
        <People heading="Who gains">
          {gained.length === 0
            ? nobody
            : gained.map((sitter) => (
                <Person key={sitter.sitterId} name={sitter.name} aside={changeCount(sitter)}>
                  {list(sitter.gains)}
                </Person>
              ))}
        </People>
        <People heading="Who loses">
          {lost.length === 0
            ? nobody
            : lost.map((sitter) => (
                <Person key={sitter.sitterId} name={sitter.name} aside={changeCount(sitter)}>
                  {list(sitter.losses)}
                </Person>
              ))}
        </People>
      </div>
      {sheets.pieces.gains.length + sheets.pieces.losses.length > 0 && (
        <section className="mt-8" aria-label="Pieces and ways">
          <RuleHeading aside={<span className="text-sm text-ink-2">{changeCount(sheets.pieces)}</span>}>
            Pieces and ways
          </RuleHeading>
          <div className="grid gap-x-10 tablet:grid-cols-2">
            {list(sheets.pieces.gains, true)}
            {list(sheets.pieces.losses, true)}
          </div>
        </section>
      )}
    </>
  );
}

function People({ heading, children }: { heading: string; children: ReactNode }) {
  return (
    <section aria-label={heading}>
      <RuleHeading>{heading}</RuleHeading>
      {children}
    </section>
  );
}

function Person({ name, aside, children }: { name: string; aside: string; children: ReactNode }) {
  return (
    <div className="mb-4">
      <h3 className="flex flex-wrap items-baseline justify-between gap-x-4 font-semibold">
        {name}
        <span className="text-sm font-normal text-ink-2">{aside}</span>
      </h3>
      {children}
    </div>
  );
}
