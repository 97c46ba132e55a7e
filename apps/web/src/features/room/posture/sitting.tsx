import { Select } from '@/components/select.tsx';
import { usePicture } from '../room-context.tsx';
import { RoomRound } from '../touching/room-round.tsx';
import { choosePlace, useChosenPlace } from './chosen-place.ts';
import { DoubtWords } from './doubt-words.tsx';
import { PostureForm } from './posture-form.tsx';
import { SittingWords } from './sitting-words.tsx';

/** The sitter that is looked at: how they sit, what may be chosen of it, and the room round everybody. */
export default function Sitting() {
  const picture = usePicture();
  const placeId = useChosenPlace((state) => state.placeId);
  const body = picture.bodies.find((one) => one.placeId === placeId) ?? picture.bodies[0];
  if (!body) return <p className="text-sm">Seat somebody whose measures are known to see how they sit.</p>;
  const markOf = (pieceId: string) => picture.document.pieces.find(({ id }) => id === pieceId)?.mark ?? '';
  return (
    <div className="flex flex-col gap-4 text-sm">
      <Select
        label="Sitter"
        value={body.placeId}
        options={picture.bodies.map((one) => ({
          value: one.placeId,
          words: one.name,
          detail: `${markOf(one.pieceId)}, ${one.placeId.split(':').at(-1)}`,
        }))}
        onChange={choosePlace}
      />
      <SittingWords body={body} />
      <DoubtWords picture={picture} body={body} />
      <PostureForm key={body.placeId} picture={picture} body={body} />
      <RoomRound picture={picture} placeId={body.placeId} />
    </div>
  );
}
