import { DoubtToggle } from '../bodies/doubt-toggle.tsx';
import type { RoomAddress } from '../hooks/use-address.ts';
import type { Choosing } from '../hooks/use-choosing.ts';
import type { View } from '../hooks/use-view.ts';
import type { SeatedBody } from '../picture.ts';
import { SectionToggle } from '../section/section-bar.tsx';
import type { SceneView } from '../scene/views.ts';
import { TapeToggle } from '../tape-tool/tape-bar.tsx';
import { Toggle } from './toggle.tsx';

interface Props {
  address: RoomAddress;
  view: View;
  letter: SceneView;
  /** Left out where only one piece can be looked at. */
  choosing: Choosing | undefined;
  bodies: { shown: boolean; show: (shown: boolean) => void };
  /** Whose measures may be in doubt; none where nobody is drawn or the reader may not know. */
  doubtOf: readonly SeatedBody[];
  /** Left out where there are none to show. */
  tapes: { shown: boolean; show: (shown: boolean) => void } | undefined;
}

/** The row under the drawing: what is shown on it, and how large. */
export function StageTools({ address, view, letter, choosing, bodies, doubtOf, tapes }: Props) {
  return (
    <div className="flex flex-wrap items-center justify-end gap-x-5 gap-y-1 py-1.5 text-sm text-ink-2">
      {choosing && (
        <Toggle on={choosing.several} onChange={choosing.setSeveral}>
          Choose several
        </Toggle>
      )}
      <Toggle on={bodies.shown} onChange={bodies.show}>
        Bodies
      </Toggle>
      {doubtOf.length > 0 && <DoubtToggle bodies={doubtOf}>Doubt</DoubtToggle>}
      {tapes && (
        <Toggle on={tapes.shown} onChange={tapes.show}>
          Tapes
        </Toggle>
      )}
      {!address.clientView && <TapeToggle />}
      <SectionToggle letter={letter} />
      <Toggle on={address.clientView} onChange={address.setClientView}>
        Client view
      </Toggle>
      <span className="flex items-center gap-1 border-l border-ink pl-3">
        <ZoomButton name="Smaller" onPress={() => view.zoomBy(1 / 1.25)}>
          −
        </ZoomButton>
        <ZoomButton name="Fit the set into the sheet" onPress={view.fit}>
          Fit
        </ZoomButton>
        <ZoomButton name="Larger" onPress={() => view.zoomBy(1.25)}>
          +
        </ZoomButton>
        {address.view === 'E' && (
          <>
            <ZoomButton name="Walk to the left" onPress={() => view.turnBy(-0.26, 0)}>
              ←
            </ZoomButton>
            <ZoomButton name="Walk to the right" onPress={() => view.turnBy(0.26, 0)}>
              →
            </ZoomButton>
          </>
        )}
      </span>
    </div>
  );
}

function ZoomButton({ name, onPress, children }: { name: string; onPress: () => void; children: string }) {
  return (
    <button
      type="button"
      aria-label={name}
      onClick={onPress}
      className="quick min-h-8 min-w-8 rounded-sm px-1.5 max-tablet:min-h-10 max-tablet:min-w-10 font-medium hover:bg-sunk hover:text-ink"
    >
      {children}
    </button>
  );
}
