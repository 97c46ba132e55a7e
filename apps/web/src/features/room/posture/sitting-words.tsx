import { jointWarnings, readJointRanges, type JointWarning, type PoseNote } from '@settlewright/geometry';
import children from '@settlewright/seed-data/populations/children.json';
import jointFile from '@settlewright/seed-data/joint-ranges.json';
import { SOURCE_MARK_WORDS } from '@settlewright/anthropometry';
import type { SeatedBody } from '../picture.ts';
import { useSurroundings } from '../room-context.tsx';
import { sayMeasuredAs } from './choice-words.ts';
import { sayNote } from './note-words.ts';

const RANGES = readJointRanges(jointFile);

/** Notes that say already where the feet are. */
const FEET_SAID: readonly PoseNote['kind'][] = ['feet-on-rail', 'ankles-crossed'];

const sayWarning = ({ joint, motion, side, deg, limitDeg, source }: JointWarning): string =>
  `${side ? `${side} ` : ''}${joint} ${motion} ${Math.round(deg)}°, beyond the ${limitDeg}° that most people manage (${source.cite}; ${SOURCE_MARK_WORDS[source.mark]})`;

const asSentence = (words: string): string => `${words.charAt(0).toUpperCase()}${words.slice(1)}.`;

/** How the sitter sits now, and what of it few people could hold. */
export function SittingWords({ body }: { body: SeatedBody }) {
  const { style } = useSurroundings();
  const notes = body.pose.notes.filter(({ kind }) => kind !== 'not-as-checked');
  const leans = notes.some(
    ({ kind }) => kind === 'sits-upright' || kind === 'slumps' || kind === 'slides-forward',
  );
  const crossed = notes.some(({ kind }) => kind === 'knees-crossed');
  const words = [
    ...(leans ? [] : ['sits against the back']),
    ...notes.map((note) => sayNote(note, style)),
    ...(body.pose.heelGapMm > 0.5 || notes.some(({ kind }) => FEET_SAID.includes(kind))
      ? []
      : [crossed ? 'right foot on the floor' : 'feet on the floor']),
    'head level',
  ];
  const warnings = jointWarnings(body.pose, RANGES);
  const measuredAs = sayMeasuredAs(body, style);
  return (
    <div>
      {body.forScale && (
        <p className="mb-1">
          <strong className="font-semibold">Drawn for scale, not checked.</strong> {children.warning}
        </p>
      )}
      <p data-sitting>{asSentence(words.join(', '))}</p>
      {measuredAs !== '' && <p className="mt-1 text-ink-2">{measuredAs}</p>}
      {warnings.map((warning) => (
        <p key={`${warning.joint} ${warning.motion} ${warning.side ?? ''}`} className="mt-1 text-tight">
          {asSentence(sayWarning(warning))}
        </p>
      ))}
    </div>
  );
}
