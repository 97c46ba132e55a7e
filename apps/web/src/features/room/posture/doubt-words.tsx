import type { MeasureKey } from '@settlewright/anthropometry';
import { Disclosure } from '@/components/disclosure.tsx';
import { DoubtToggle } from '../bodies/doubt-toggle.tsx';
import { doubtOf } from '../bodies/doubt.ts';
import type { RoomPicture, SeatedBody } from '../picture.ts';
import { useSurroundings } from '../room-context.tsx';
import { doubtLines, sayCertain } from './doubt-lines.ts';

/** The lines that stand open; the others are folded away. */
const OPEN_LINES = 4;

interface Props {
  picture: RoomPicture;
  body: SeatedBody;
}

/** Which measures of the sitter are in doubt, and by how much. */
export function DoubtWords({ picture, body }: Props) {
  const { style } = useSurroundings();
  const range = doubtOf(body);
  if (!range) return null;
  const lines = doubtLines(range, style);
  const [open, folded] = [lines.slice(0, OPEN_LINES), lines.slice(OPEN_LINES)];
  return (
    <section aria-label="In doubt">
      {lines.length === 0 ? (
        <p>{sayCertain(body.belief)}</p>
      ) : (
        <>
          <p>In doubt; 90 of 100 such people lie between:</p>
          <Lines lines={open} />
          {folded.length > 0 && (
            <Disclosure words={`${folded.length} more in doubt`}>
              <Lines lines={folded} />
            </Disclosure>
          )}
          <DoubtToggle bodies={picture.bodies}>Doubt drawn round the body</DoubtToggle>
        </>
      )}
    </section>
  );
}

const Lines = ({ lines }: { lines: readonly { key: MeasureKey; words: string }[] }) => (
  <ul className="text-ink-2">
    {lines.map(({ key, words }) => (
      <li key={key}>{words}</li>
    ))}
  </ul>
);
