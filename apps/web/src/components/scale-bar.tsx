import { useUnitStyle } from '@/lib/unit-choice.ts';

const FOOT_MM = 304.8;

/** Steps a bar may have, longest first, with the words at its end. */
const FEET = [20, 10, 8, 4, 2, 1].map((feet) => ({
  mm: feet * FOOT_MM,
  half: `${feet / 2}`,
  full: `${feet} ft`,
}));
const METRES = [5, 4, 2, 1, 0.5].map((metres) => ({
  mm: metres * 1000,
  half: `${metres / 2}`,
  full: `${metres} m`,
}));

/** A bar of a round length: dark half, light half, so that it survives a black and white print. */
export function ScaleBar({ pxPerMm, roomPx = 120 }: { pxPerMm: number; roomPx?: number }) {
  const metric = useUnitStyle().system === 'millimetres';
  const steps = metric ? METRES : FEET;
  const step = steps.find(({ mm }) => mm * pxPerMm <= roomPx) ?? steps[steps.length - 1];
  if (step === undefined) return null;
  const width = step.mm * pxPerMm;
  return (
    <svg
      width={width + 44}
      height="22"
      viewBox={`-6 0 ${width + 44} 22`}
      role="img"
      aria-label={`Scale bar of ${step.full}`}
      className="tape shrink-0"
    >
      <g fill="var(--color-ink-2)" fontSize="12">
        <text x="0" y="10" textAnchor="middle">
          0
        </text>
        <text x={width / 2} y="10" textAnchor="middle">
          {step.half}
        </text>
        <text x={width} y="10" textAnchor="middle">
          {step.full.split(' ')[0]}
          <tspan dx="3">{step.full.split(' ')[1]}</tspan>
        </text>
      </g>
      <rect x="0" y="15" width={width} height="5" fill="var(--color-ink)" />
      <rect x={width / 4} y="16" width={width / 4} height="3" fill="var(--color-paper)" />
      <rect x={(width * 3) / 4} y="16" width={width / 4} height="3" fill="var(--color-paper)" />
    </svg>
  );
}
