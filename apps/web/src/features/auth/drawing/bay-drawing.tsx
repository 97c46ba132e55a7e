import { LayFigure } from './lay-figure.tsx';
import { Settle } from './settle.tsx';
import { Tape } from './tape.tsx';

const FLOOR = 1650;
const MIDDLE = 1310;

/** The bay beyond the glass: two ranges of hills under a pale sky. */
function Window() {
  return (
    <g>
      <rect
        x="690"
        y="120"
        width="1240"
        height="640"
        rx="70"
        fill="var(--color-oak-2)"
        stroke="var(--color-pen)"
        strokeWidth="4"
      />
      <clipPath id="bay-glass">
        <rect x="734" y="164" width="1152" height="552" rx="40" />
      </clipPath>
      <g clipPath="url(#bay-glass)">
        <rect x="734" y="164" width="1152" height="552" fill="var(--color-daylight)" />
        <path
          d="M734 520C840 430 930 470 1010 540S1180 430 1290 400 1460 520 1560 500 1760 380 1886 450V716H734Z"
          fill="var(--color-hill-1)"
        />
        <path
          d="M734 640C860 560 960 600 1060 640S1260 560 1400 590 1640 680 1886 570V716H734Z"
          fill="var(--color-hill-2)"
        />
        <path
          d="M734 250Q1010 340 1286 262T1886 268"
          fill="none"
          stroke="var(--color-rule-strong)"
          strokeWidth="3"
          opacity="0.6"
        />
      </g>
      <rect
        x="734"
        y="164"
        width="1152"
        height="552"
        rx="40"
        fill="none"
        stroke="var(--color-pen)"
        strokeWidth="4"
      />
      <path d="M1296 164v552M1324 164v552" stroke="var(--color-pen)" strokeWidth="4" />
      <path d="M1298 166h24v548h-24Z" fill="var(--color-oak-1)" />
      <path d="M560 764h1500v34H560Z" fill="var(--color-oak-1)" stroke="var(--color-pen)" strokeWidth="4" />
      <path d="M600 798h1420v24H600Z" fill="var(--color-oak-3)" stroke="var(--color-pen)" strokeWidth="4" />
    </g>
  );
}

/** Wall and floor are a wash that fades into the sheet: the room is drawn on the page and has no frame. */
function Wall() {
  const boards = Array.from({ length: 29 }, (_, index) => 60 + index * 90);
  return (
    <g mask="url(#bay-fade)">
      <filter id="bay-soft" x="-20%" y="-20%" width="140%" height="140%">
        <feGaussianBlur stdDeviation="90" />
      </filter>
      <mask id="bay-fade" maskUnits="userSpaceOnUse" x="-100" y="-200" width="2820" height="2300">
        <rect x="210" y="60" width="2200" height="1660" fill="white" filter="url(#bay-soft)" />
      </mask>
      <rect x="-100" y="-200" width="2820" height={FLOOR + 200} fill="var(--color-wall)" />
      <g stroke="var(--color-rule)" strokeWidth="3">
        {boards.map((x) => (
          <path key={x} d={`M${x} 830V1530`} />
        ))}
      </g>
      <rect x="-100" y="1530" width="2820" height="120" fill="var(--color-oak-2)" opacity="0.5" />
      <path d="M-100 1530h2820" stroke="var(--color-rule-strong)" strokeWidth="3" />
      <rect x="-100" y={FLOOR} width="2820" height="400" fill="var(--color-floor)" />
    </g>
  );
}

/** Top 29″ off the floor, on a trestle of two posts. */
function Table() {
  const top = FLOOR - 737;
  return (
    <g stroke="var(--color-pen)" strokeWidth="4" strokeLinejoin="round">
      <path d={`M1100 ${FLOOR}v-44h420v44Z`} fill="var(--color-walnut-2)" />
      <path d={`M1262 ${FLOOR - 44}V${top + 96}h96V${FLOOR - 44}Z`} fill="var(--color-walnut-2)" />
      <path d={`M1326 ${FLOOR - 44}V${top + 96}h32V${FLOOR - 44}Z`} fill="var(--color-walnut-3)" />
      <path d={`M1030 ${top + 32}h560l-30 64h-500Z`} fill="var(--color-oak-3)" />
      <path d={`M930 ${top}h760v32H930Z`} fill="var(--color-oak-1)" />
    </g>
  );
}

function Lamp() {
  return (
    <g strokeLinejoin="round">
      <path d="M1310 -60V250" stroke="var(--color-pen)" strokeWidth="5" />
      <path
        d="M1262 250h96l66 132h-228Z"
        fill="var(--color-sitter-5)"
        stroke="var(--color-pen)"
        strokeWidth="4"
      />
      <path d="M1196 382h228" stroke="var(--color-pen)" strokeWidth="7" />
    </g>
  );
}

function Cup({ x }: { x: number }) {
  const top = FLOOR - 737;
  return (
    <g stroke="var(--color-pen)" strokeWidth="3.5" fill="var(--color-china)" strokeLinejoin="round">
      <path d={`M${x - 34} ${top - 62}h68q0 54-20 58h-28q-20-4-20-58Z`} />
      <path d={`M${x - 56} ${top - 5}h112`} strokeWidth="7" stroke="var(--color-pen)" />
    </g>
  );
}

/**
 * A bay cut through its middle, to scale: what the whole application is about.
 * The figure at the right is too short for the seat, and the tape says by how much.
 */
export function BayDrawing() {
  return (
    <svg
      viewBox="150 -60 2320 1900"
      className="h-full w-full overflow-visible"
      preserveAspectRatio="xMidYMid meet"
      role="img"
      aria-label="Two people on facing settles at a table under a window. Tapes give the seat height, 18 inches, and the gap under the shorter person’s heels, one and three quarter inches."
    >
      <Wall />
      <Window />
      <Lamp />
      <ellipse cx={MIDDLE} cy={FLOOR + 60} rx="1060" ry="46" fill="var(--color-shade)" opacity="0.5" />
      <Settle x={1000} floor={FLOOR} />
      <g transform={`translate(${MIDDLE * 2} 0) scale(-1 1)`}>
        <Settle x={1000} floor={FLOOR} />
      </g>
      <Table />
      <LayFigure
        colour={2}
        head={[640, 394]}
        neck={[610, 534]}
        shoulder={[592, 652]}
        chest={[622, 790]}
        belly={[662, 960]}
        hip={[670, 1086]}
        knee={[1092, 1120]}
        ankle={[1080, FLOOR - 72]}
        elbow={[716, 944]}
        wrist={[944, 876]}
      />
      <g transform={`translate(${MIDDLE * 2} 0) scale(-1 1)`}>
        <LayFigure
          colour={1}
          head={[646, 508]}
          neck={[622, 640]}
          shoulder={[602, 742]}
          chest={[628, 860]}
          belly={[662, 1000]}
          hip={[670, 1090]}
          knee={[1050, 1126]}
          ankle={[1036, FLOOR - 72 - 44]}
          elbow={[718, 984]}
          wrist={[930, 876]}
        />
      </g>
      <Cup x={1130} />
      <Cup x={1480} />
      <Tape x={292} from={FLOOR - 457} to={FLOOR} name="seat" value="18″" />
      <g>
        <path
          d={`M1638 ${FLOOR - 44}v44M1614 ${FLOOR - 44}h48M1614 ${FLOOR}h48`}
          stroke="var(--color-wont)"
          strokeWidth="7"
          fill="none"
        />
        <path d={`M1638 ${FLOOR}L1680 ${FLOOR + 86}`} stroke="var(--color-wont)" strokeWidth="4" />
        <rect
          x="1560"
          y={FLOOR + 84}
          width="372"
          height="78"
          rx="5"
          fill="var(--color-sheet)"
          stroke="var(--color-wont)"
          strokeWidth="4"
        />
        <text x="1586" y={FLOOR + 136} fontSize="42" fill="var(--color-wont)">
          under heel{' '}
          <tspan fontWeight="600">
            1<tspan style={{ fontFeatureSettings: "'frac'" }}>3/4</tspan>″
          </tspan>
        </text>
      </g>
    </svg>
  );
}
