import type { LabelBoxes } from '../overlay/box.ts';
import type { View } from '../hooks/use-view.ts';
import type { RoomPicture } from '../picture.ts';
import { useSurroundings } from '../room-context.tsx';
import { SectionOnScene } from '../section/section-on-scene.tsx';
import { useIsMoving } from '../store.ts';
import { GapsOnScene } from '../touching/gaps-on-scene.tsx';
import { LensMask } from '../views/lens-mask.tsx';
import { LensOnPlan } from '../views/lens-on-plan.tsx';
import type { Seen } from '../views/use-seen.ts';
import { WayOnScene } from '../ways/way-on-scene.tsx';

interface Props {
  picture: RoomPicture;
  view: View;
  seen: Seen;
  labels: LabelBoxes;
  clientView: boolean;
}

/** What is laid over the drawing when it is asked for: a way in, gaps, the cut, the lens. */
export default function SceneLayers({ picture, view, seen, labels, clientView }: Props) {
  const { style } = useSurroundings();
  const isMoving = useIsMoving();
  const { controller } = view;
  return (
    <>
      {!isMoving && <WayOnScene controller={controller} labels={labels} style={style} />}
      {!clientView && !isMoving && <GapsOnScene controller={controller} cut={view.cut} style={style} />}
      <SectionOnScene picture={picture} controller={controller} />
      {view.lensBox && <LensMask box={view.lensBox} />}
      {seen.letter === 'D' && seen.lens && (
        <LensOnPlan controller={controller} lens={seen.lens} style={style} />
      )}
    </>
  );
}
