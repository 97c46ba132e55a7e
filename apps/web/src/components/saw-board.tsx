interface SawBoardProps {
  /** 0 to 1. */
  share: number;
  label: string;
  /** "230 of at most 600". */
  words: string;
}

const LENGTH = 600;
const HEIGHT = 34;

/** A long job: a board sawn along its length, as far as the work has come. */
export function SawBoard({ share, label, words }: SawBoardProps) {
  const at = Math.max(0, Math.min(1, share)) * LENGTH;
  return (
    <div
      role="progressbar"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={100}
      aria-valuenow={Math.round(share * 100)}
      aria-valuetext={words}
    >
      <svg
        viewBox={`0 0 ${LENGTH} ${HEIGHT}`}
        preserveAspectRatio="none"
        className="block h-8 w-full"
        aria-hidden="true"
      >
        <rect
          x="0.6"
          y="0.6"
          width={LENGTH - 1.2}
          height={HEIGHT - 1.2}
          fill="var(--color-oak-1)"
          stroke="var(--color-pen)"
          strokeWidth="1.1"
          vectorEffect="non-scaling-stroke"
        />
        <g stroke="var(--color-oak-3)" strokeWidth="1" fill="none" vectorEffect="non-scaling-stroke">
          <path d={`M0 7C120 4 260 10 ${LENGTH} 6`} />
          <path d={`M0 28C180 31 380 25 ${LENGTH} 29`} />
        </g>
        <path
          d={`M0 ${HEIGHT / 2}H${at}`}
          stroke="var(--color-pen)"
          strokeWidth="3"
          vectorEffect="non-scaling-stroke"
        />
        <path
          d={`M${at} 0V${HEIGHT}`}
          stroke="var(--color-chalk)"
          strokeWidth="2"
          vectorEffect="non-scaling-stroke"
        />
      </svg>
    </div>
  );
}
