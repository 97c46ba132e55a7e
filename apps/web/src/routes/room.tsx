import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { FitFoot, FitViewContext } from '@/features/fit/index.ts';
import { RoomPage, SpecLine, useRoomForFit } from '@/features/room/index.ts';

/** Hands the room's live sheet to the fit strip and drawer. */
function RoomFoot({ pageTo }: { pageTo: string }) {
  const room = useRoomForFit();
  return (
    <FitViewContext value={room}>
      <FitFoot
        isOpen={room.drawerOpen}
        onToggle={() => room.openDrawer(!room.drawerOpen)}
        shortcut="F"
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
  return <RoomPage key={setId} path={path} foot={<RoomFoot pageTo={pageTo} />} />;
}
