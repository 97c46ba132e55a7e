import { memo } from 'react';
import { classNames } from '@/components/class-names.ts';
import type { StickBand } from '@settlewright/geometry';
import { Sentence } from './sentence.tsx';

const SWATCH = 'mr-1.5 inline-block w-8 align-[-2px] border border-rule-strong';

/** What the laths mean, whether one value suits all, and what is usual. */
export const StickLegend = memo(function StickLegend({
  common,
  bands,
}: {
  common: string;
  bands: readonly StickBand[];
}) {
  return (
    <div className="mt-1 grid gap-1 text-sm text-ink-2">
      <p className="flex flex-wrap gap-x-5 gap-y-1">
        <span>
          <span className={classNames(SWATCH, 'h-3.5 bg-oak-1')} />
          fits
        </span>
        <span>
          <span className={classNames(SWATCH, 'h-2 bg-oak-2 align-[1px]')} />
          tight
        </span>
        <span>
          <span
            className={classNames(
              SWATCH,
              'h-3.5 border-x-0 bg-oak-1 [mask:linear-gradient(90deg,transparent,#000_35%,#000_65%,transparent)]',
            )}
          />
          est., ends fade over the 90 in 100 range of each check by itself, best guess dashed
        </span>
      </p>
      <p className="font-medium text-ink">
        <Sentence text={common} />
      </p>
      {bands.map(({ words }) => (
        <p key={words}>
          <Sentence text={words} />
        </p>
      ))}
    </div>
  );
});
