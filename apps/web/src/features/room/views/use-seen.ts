import type { LensCamera, NamedView, SetDocument } from '@settlewright/geometry';
import { useEffect, useState } from 'react';
import type { RoomAddress } from '../hooks/use-address.ts';
import type { Hand } from '../hooks/moving-hand.ts';
import { useSurroundings } from '../room-context.tsx';
import { VIEW_TITLES, type Cut, type SceneView } from '../scene/views.ts';
import { useSectionCut } from '../section/section-store.ts';
import { offerPresentView } from './present-view.ts';

const DEG = Math.PI / 180;

/** What the scene is seen through, and what is shown of the set. */
export interface Seen {
  letter: SceneView;
  /** The named view that is looked through. */
  named: NamedView | undefined;
  /** A lens that is worked on while another view shows it on the plan. */
  lens: { id: string; camera: LensCamera } | undefined;
  /** Where the hand or the named view cuts the set. */
  section: Cut | undefined;
  bodies: { shown: boolean; show: (shown: boolean) => void };
  tapes: { shown: boolean; show: (shown: boolean) => void };
}

/** Puts the address and the named views of a set together. */
export function useSeen(document: SetDocument, address: RoomAddress): Seen {
  const [bodies, showBodies] = useState(true);
  const [tapes, showTapes] = useState(true);
  const chosen = document.views?.find(({ id }) => id === address.namedId);
  const named = address.throughNamed ? chosen : undefined;
  const [shownAs, setShownAs] = useState<string>();
  if (shownAs !== named?.id) {
    setShownAs(named?.id);
    if (named) {
      showBodies(named.shown.bodies);
      showTapes(named.shown.tapes);
    }
  }
  const section = useSectionCut(useSurroundings().path.setId, named);
  const camera = chosen?.camera;
  return {
    letter: !named ? address.view : named.camera.kind === 'lens' ? 'lens' : named.camera.letter,
    named,
    lens: chosen && camera?.kind === 'lens' ? { id: chosen.id, camera } : undefined,
    section,
    bodies: { shown: bodies, show: showBodies },
    tapes: { shown: tapes, show: showTapes },
  };
}

/** Lets the list of views ask how the room is seen now. */
export function useOfferPresentView(
  { letter, named, bodies, tapes }: Seen,
  { hand, cut }: { hand: Hand; cut: Cut | undefined },
  clientView: boolean,
) {
  useEffect(
    () =>
      offerPresentView(() => ({
        name: VIEW_TITLES[letter],
        camera:
          letter === 'lens' && named
            ? named.camera
            : {
                kind: 'letter',
                letter: letter === 'lens' ? 'A' : letter,
                zoom: hand.zoom,
                panMm: [hand.panMm[0], hand.panMm[1]],
                azimuthDeg: hand.azimuth / DEG,
                elevationDeg: hand.elevation / DEG,
              },
        shown: { bodies: bodies.shown, tapes: tapes.shown, clientView },
        ...(cut && { section: { pointMm: [...cut.pointMm], toward: [...cut.toward] } }),
      })),
    [letter, named, bodies.shown, tapes.shown, clientView, hand, cut],
  );
}
