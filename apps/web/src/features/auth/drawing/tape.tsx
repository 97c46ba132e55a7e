interface TapeProps {
  x: number;
  from: number;
  to: number;
  name: string;
  value: string;
}

/** An upright tape with a tick each inch, longer at six, and its flag read level. */
export function Tape({ x, from, to, name, value }: TapeProps) {
  const inches = Array.from({ length: Math.floor((to - from) / 25.4) - 1 }, (_, index) => index + 1);
  const middle = (from + to) / 2;
  return (
    <g stroke="var(--color-chalk)" fill="none">
      <path d={`M${x} ${from}V${to}M${x - 30} ${from}h60M${x - 30} ${to}h60`} strokeWidth="7" />
      <path
        d={inches.map((inch) => `M${x} ${to - inch * 25.4}h${inch % 6 === 0 ? -24 : -13}`).join('')}
        strokeWidth="3"
      />
      <rect
        x={x - 105}
        y={middle - 42}
        width="210"
        height="84"
        rx="5"
        fill="var(--color-chalk)"
        stroke="none"
      />
      <text
        x={x}
        y={middle + 15}
        textAnchor="middle"
        fontSize="42"
        fill="var(--color-on-chalk)"
        stroke="none"
      >
        {name} <tspan fontWeight="600">{value}</tspan>
      </text>
    </g>
  );
}
