/** The settle in side view: two strokes of ink and a chalk cushion. */
export function BrandMark({ size = 28 }: { size?: number }) {
  return (
    <svg
      viewBox="0 0 28 28"
      width={size}
      height={size}
      aria-hidden="true"
      focusable="false"
      className="shrink-0"
    >
      <rect x="8.2" y="12.6" width="15" height="4" rx="0.8" fill="var(--color-chalk)" />
      <path
        d="M4.4 3.4 7.6 24.4M6.8 18.2h16.4M22.6 18.2v6.2"
        fill="none"
        stroke="var(--color-ink)"
        strokeWidth="2.1"
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </svg>
  );
}

export function Wordmark({ quiet = false }: { quiet?: boolean }) {
  return (
    <span className="inline-flex items-center gap-2.5 text-[1.0625rem] font-semibold tracking-[-0.01em]">
      <BrandMark />
      <span className={quiet ? 'max-tablet:sr-only' : undefined}>Settlewright</span>
    </span>
  );
}
