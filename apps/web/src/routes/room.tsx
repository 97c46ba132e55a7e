import { useMemo, useState } from 'react';
import { useParams } from 'react-router-dom';
import { FitFoot, FitViewContext, type FitView } from '@/features/fit/index.ts';
import { RoomPage, SpecLine, useRoomForFit, useSingleKeys } from '@/features/room/index.ts';

/** The fit sheet at the foot of the room. */
function Foot({ pageTo }: { pageTo: string }) {
  const room = useRoomForFit();
  const [openCellId, setOpenCellId] = useState<string | null>(null);
  const singleKeys = useSingleKeys((state) => state.on);
  const view = useMemo<FitView>(() => ({ ...room, openCellId, open: setOpenCellId }), [room, openCellId]);
  return (
    <FitViewContext value={view}>
      <FitFoot
        isOpen={room.drawerOpen}
        onToggle={() => room.openDrawer(!room.drawerOpen)}
        shortcut={singleKeys ? 'F' : undefined}
        line={<SpecLine />}
        pageTo={pageTo}
      />
    </FitViewContext>
  );
}

/** The room of a set, with its fit sheet at the foot. */
export function Component() {
  const { workshopId = '', productionId = '', setId = '' } = useParams();
  const path = useMemo(() => ({ workshopId, productionId, setId }), [workshopId, productionId, setId]);
  const pageTo = `/w/${workshopId}/p/${productionId}/sets/${setId}/fit`;
  return <RoomPage key={setId} path={path} foot={<Foot pageTo={pageTo} />} />;
}
