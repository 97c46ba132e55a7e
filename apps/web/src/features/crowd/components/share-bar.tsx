import type { Share } from '@settlewright/anthropometry';

interface ShareBarProps {
  fits: Share;
  atLeastTight: Share;
}

const percent = (share: number): string => `${share * 100}%`;

/** Of 100 people: those who fit as a full bar, those who are tight as a hatched end; the words stand beside it. */
export function ShareBar({ fits, atLeastTight }: ShareBarProps) {
  return (
    <span className="tape relative block h-3 min-w-24 border-b border-rule-strong bg-sunk" aria-hidden="true">
      <span
        className="absolute inset-y-0 left-0 border-r border-tight bg-[repeating-linear-gradient(135deg,var(--color-tight)_0_1.5px,transparent_1.5px_5px)]"
        style={{ width: percent(atLeastTight.value) }}
      />
      <span className="absolute inset-y-0 left-0 bg-fits" style={{ width: percent(fits.value) }} />
      {[25, 50, 75].map((at) => (
        <span key={at} className="absolute top-full h-1 w-px bg-rule-strong" style={{ left: `${at}%` }} />
      ))}
    </span>
  );
}
