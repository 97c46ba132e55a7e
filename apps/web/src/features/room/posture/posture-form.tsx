import { choosePosture, type PoseNote, type PostureChoice } from '@settlewright/geometry';
import { useMemo } from 'react';
import { toast } from 'sonner';
import { Button } from '@/components/button.tsx';
import { Select } from '@/components/select.tsx';
import { announce } from '@/lib/announce.ts';
import { shortName } from '@/lib/short-name.ts';
import { useTakeStep } from '../hooks/use-take-step.ts';
import type { RoomPicture, SeatedBody } from '../picture.ts';
import { useSurroundings } from '../room-context.tsx';
import { useRoomStore } from '../store.ts';
import { ARM_WORDS, sayChoice, TRUNK_WORDS } from './choice-words.ts';
import { NudgeFields } from './nudge-fields.tsx';
import { sayNote } from './note-words.ts';
import { refusalOf } from './try-posture.ts';

const USUAL = 'usual';
/** The word about a choice that cannot be had; gone once another is made. */
const REFUSED = 'posture refused';
type OrUsual<T extends string> = T | typeof USUAL;

/** What is left of a choice once its empty parts are dropped; null for the posture that the place suggests. */
function cleaned({ trunk, arms, feet, nudge }: PostureChoice): PostureChoice | null {
  const moved = nudge && (nudge.leftMm !== 0 || nudge.aheadMm !== 0);
  const kept = {
    ...(trunk && { trunk }),
    ...(arms && { arms }),
    ...(feet && { feet }),
    ...(moved && { nudge }),
  };
  return Object.keys(kept).length > 0 ? kept : null;
}

interface Props {
  picture: RoomPicture;
  body: SeatedBody;
}

/** What may be chosen of a posture; each choice is one named step, and what cannot be had says why. */
export function PostureForm({ picture, body }: Props) {
  const { canEdit, style } = useSurroundings();
  const store = useRoomStore();
  const take = useTakeStep();
  const seat = picture.document.seating.find(({ pieceId, place }) => `${pieceId}:${place}` === body.placeId);
  const choice = seat?.posture ?? {};
  const { refused, feetHang } = useMemo(() => {
    const { trunk, nudge } = body.at.choice ?? {};
    const why = (part: PostureChoice) => refusalOf(body, { trunk, nudge, ...part });
    const refused = new Map<string, PoseNote | undefined>();
    for (const feet of ['rail', 'knees-crossed'] as const) refused.set(feet, why({ feet }));
    for (const arms of ['table', 'cup', 'sill-left', 'sill-right'] as const) refused.set(arms, why({ arms }));
    return { refused, feetHang: body.pose.heelGapMm > 0.5 };
  }, [body]);
  if (!seat || !canEdit) return null;
  const name = shortName(body.name);

  function change(part: PostureChoice) {
    if (!seat) return;
    toast.dismiss(REFUSED);
    const next = cleaned({ ...choice, ...part });
    const said = sayChoice(next ?? undefined, style);
    const step = said === '' ? `${name} in the standard posture` : `${name} ${said}`;
    take(choosePosture(store.getState().document, seat.pieceId, seat.place, next), step);
  }
  function ask(key: string, part: PostureChoice) {
    const why = refused.get(key);
    if (!why) return change(part);
    const words = `Not chosen for ${name}: ${sayNote(why, style)}.`;
    toast(words, { id: REFUSED });
    announce(words);
  }
  const detailOf = (key: string) => {
    const why = refused.get(key);
    return why ? { detail: sayNote(why, style) } : {};
  };

  return (
    <div className="grid gap-3">
      <Select<OrUsual<keyof typeof TRUNK_WORDS>>
        label="Trunk"
        value={choice.trunk ?? USUAL}
        options={[
          { value: USUAL, words: 'As the place suggests' },
          ...(['back', 'upright', 'slumped'] as const).map((value) => ({ value, words: TRUNK_WORDS[value] })),
        ]}
        onChange={(value) => change({ trunk: value === USUAL ? undefined : value })}
      />
      <Select<OrUsual<keyof typeof ARM_WORDS>>
        label="Arms"
        value={choice.arms ?? USUAL}
        options={[
          { value: USUAL, words: 'As the place suggests' },
          ...(Object.keys(ARM_WORDS) as (keyof typeof ARM_WORDS)[]).map((value) => ({
            value,
            words: ARM_WORDS[value],
            ...detailOf(value),
          })),
        ]}
        onChange={(value) => ask(value, { arms: value === USUAL ? undefined : value })}
      />
      <Select<OrUsual<NonNullable<PostureChoice['feet']>>>
        label="Feet"
        value={choice.feet ?? USUAL}
        options={[
          { value: USUAL, words: 'As the place suggests' },
          { value: 'floor', words: feetHang ? 'Hanging' : 'On the floor, hanging where they do not reach' },
          { value: 'rail', words: 'On the rail', ...detailOf('rail') },
          { value: 'ankles-crossed', words: 'Ankles crossed' },
          { value: 'knees-crossed', words: 'Knees crossed', ...detailOf('knees-crossed') },
        ]}
        onChange={(value) => ask(value, { feet: value === USUAL ? undefined : value })}
      />
      <NudgeFields nudge={choice.nudge} onChange={(nudge) => change({ nudge })} />
      {seat.posture && (
        <Button
          size="small"
          onClick={() => change({ trunk: undefined, arms: undefined, feet: undefined, nudge: undefined })}
        >
          Standard posture
        </Button>
      )}
    </div>
  );
}
