/**
 * A high-backed settle in section, the sitter facing right: deck, cushions, leaning back and kick.
 * `x` is the seat front; 457 mm to the pressed seat, 445 mm deep, back leaning 8°.
 */
export function Settle({ x, floor }: { x: number; floor: number }) {
  const deck = floor - 381;
  const seat = floor - 476;
  const backFoot = x - 560;
  return (
    <g stroke="var(--color-pen)" strokeWidth="4" strokeLinejoin="round">
      <path
        d={`M${x - 60} ${floor}H${backFoot + 40}V${deck}H${x - 20}V${floor - 96}H${x - 60}Z`}
        fill="var(--color-walnut-2)"
      />
      <path d={`M${x - 60} ${floor}v-96h-460v96Z`} fill="var(--color-walnut-3)" />
      <path
        d={`M${backFoot} ${floor}L${backFoot - 150} ${floor - 1240}h46L${backFoot + 56} ${floor}Z`}
        fill="var(--color-oak-2)"
      />
      <path d={`M${backFoot - 178} ${floor - 1262}h102v34h-102Z`} fill="var(--color-oak-3)" />
      <path
        d={`M${backFoot + 12} ${deck}h${x - backFoot - 6}v26H${backFoot + 12}Z`}
        fill="var(--color-oak-1)"
      />
      <path
        d={`M${x - 470} ${seat + 6}Q${x - 250} ${seat - 16} ${x - 26} ${seat + 8}Q${x} ${seat + 40} ${x - 12} ${deck}H${x - 498}Q${x - 506} ${seat + 40} ${x - 470} ${seat + 6}Z`}
        fill="var(--color-cloth-2)"
      />
      <path
        d={`M${x - 558} ${seat - 8}L${x - 648} ${seat - 690}Q${x - 648} ${seat - 726} ${x - 606} ${seat - 726}Q${x - 558} ${seat - 722} ${x - 546} ${seat - 670}Q${x - 476} ${seat - 330} ${x - 448} ${seat - 34}Q${x - 448} ${seat - 4} ${x - 478} ${seat}Z`}
        fill="var(--color-cloth-2)"
      />
      <path
        d={`M${x - 520} ${seat - 40}Q${x - 560} ${seat - 360} ${x - 604} ${seat - 660}`}
        stroke="var(--color-cloth-3)"
        fill="none"
      />
    </g>
  );
}
