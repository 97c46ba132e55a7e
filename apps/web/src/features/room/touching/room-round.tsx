import {
  envelopeGap,
  jointEnvelopes,
  SEAT_ROLES,
  type JointEnvelope,
  readJointRanges,
  type SitterDistances,
  type SitterGap,
} from '@settlewright/geometry';
import jointFile from '@settlewright/seed-data/joint-ranges.json';
import { useEffect, useMemo, useState } from 'react';
import { Toggle } from '../components/toggle.tsx';
import type { RoomPicture } from '../picture.ts';
import { choosePlace } from '../posture/chosen-place.ts';
import { useSurroundings } from '../room-context.tsx';
import { hideGaps, showGaps } from './shown-gaps.ts';
import {
  isMeant,
  meetings,
  sayGap,
  sayRests,
  saySwept,
  sayThing,
  sayTouches,
  SWEPT_WITHIN_MM,
  type Meeting,
} from './touch-words.ts';
import { useDistances } from './use-distances.ts';

const RANGES = readJointRanges(jointFile);

interface Props {
  picture: RoomPicture;
  placeId: string;
}

/** For every sitter what they touch, what they reach into, and the smallest gap that is left. */
export function RoomRound({ picture, placeId }: Props) {
  const { style } = useSurroundings();
  const { distances, fault } = useDistances(picture);
  const [envelopes, setEnvelopes] = useState(false);
  useEffect(
    () =>
      showGaps({
        overlaps: distances?.flatMap((one) => inTheWayOf(one).map(({ deepest }) => deepest)) ?? [],
      }),
    [distances],
  );
  useEffect(() => hideGaps, []);
  const pose = picture.bodies.find((body) => body.placeId === placeId)?.pose;
  const swept = useMemo(() => (envelopes && pose ? jointEnvelopes(pose, RANGES) : []), [envelopes, pose]);
  useEffect(() => showGaps({ envelopes: swept }), [swept]);
  const rooms = useMemo(
    () => swept.map((envelope) => ({ envelope, gap: sweptGap(envelope, picture, placeId) })),
    [swept, picture, placeId],
  );
  return (
    <div>
      <h3 className="font-semibold">Room round each sitter</h3>
      {fault && <p className="text-wont">{fault} Change the set or open this again.</p>}
      {!distances && !fault && <p role="status">Measuring.</p>}
      <ul className="flex flex-col gap-2 pt-1">
        {distances?.map((one) => (
          <Sitter key={one.placeId} one={one} picture={picture} chosen={one.placeId === placeId} />
        ))}
      </ul>
      <Toggle on={envelopes} onChange={setEnvelopes}>
        What elbows and knees sweep
      </Toggle>
      <ul>
        {rooms.map(({ envelope, gap }) => (
          <li key={`${envelope.side} ${envelope.joint}`}>{saySwept(envelope, gap, picture, style)}</li>
        ))}
      </ul>
      {envelopes &&
        RANGES.sweeps.map(({ joint, words, source }) => (
          <p key={joint} className="text-ink-3">
            {words} {source.cite}.
          </p>
        ))}
      <p className="text-ink-3">
        Between the bodies as drawn and the parts; the seat and the back they rest on are left out. Guidance:
        no check reads it.{' '}
        {`What is measured on the skin is right within ${style.system === 'millimetres' ? '3 mm' : '1/8″'}.`}
      </p>
    </div>
  );
}

/** How near an elbow or knee comes to a part while it moves; the seat and back it rests on are left out. */
function sweptGap(envelope: JointEnvelope, { bodies, parts }: RoomPicture, placeId: string) {
  const own = bodies.find((body) => body.placeId === placeId)?.pieceId;
  const others = parts.filter(({ pieceId, role }) => pieceId !== own || !SEAT_ROLES.includes(role));
  return envelopeGap(envelope, others, SWEPT_WITHIN_MM);
}

/** What a sitter reaches into and does not rest on. */
const inTheWayOf = ({ overlaps }: SitterDistances): Meeting[] =>
  meetings(overlaps.filter((gap) => !isMeant(gap)));

interface SitterProps {
  one: SitterDistances;
  picture: RoomPicture;
  chosen: boolean;
}

function Sitter({ one, picture, chosen }: SitterProps) {
  const { style } = useSurroundings();
  const name = picture.bodies.find(({ placeId }) => placeId === one.placeId)?.name ?? '';
  const rests = sayRests([...one.overlaps, ...one.contacts].filter(isMeant), picture);
  const touches = sayTouches(
    one.contacts.filter((gap) => !isMeant(gap)),
    picture,
  );
  return (
    <li className={chosen ? 'border-l-2 border-ink pl-2' : 'pl-2.5'}>
      <p className="font-medium">{name}</p>
      {inTheWayOf(one).map(({ deepest, also }) => (
        <GapLine key={sayThing(deepest, picture)} gap={deepest} placeId={one.placeId} tone="text-wont">
          {sayGap(deepest, picture, style) + (also.length > 0 ? `; also ${also.join(', ')}` : '')}
        </GapLine>
      ))}
      {touches.length > 0 && <p className="text-tight">Touches {touches.join('; ')}</p>}
      {rests.length > 0 && <p>Rests: {rests.join(', ')}</p>}
      {one.smallest ? (
        <GapLine gap={one.smallest} placeId={one.placeId}>
          {sayGap(one.smallest, picture, style)}
        </GapLine>
      ) : (
        <p>Nothing within reach</p>
      )}
    </li>
  );
}

function GapLine({
  gap,
  placeId,
  tone = '',
  children,
}: {
  gap: SitterGap;
  placeId: string;
  tone?: string;
  children: string;
}) {
  const light = () => showGaps({ lit: gap });
  const dim = () => showGaps({ lit: undefined });
  return (
    <p>
      <button
        type="button"
        className={`link min-h-6 text-left ${tone}`}
        onMouseEnter={light}
        onMouseLeave={dim}
        onFocus={light}
        onBlur={dim}
        onClick={() => {
          choosePlace(placeId);
          light();
        }}
      >
        {children}
      </button>
    </p>
  );
}
