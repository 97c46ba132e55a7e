import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { FitFoot, FitViewContext, SeatHeightBand } from '@/features/fit/index.ts';
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

/** Under the seat height: what is usual, what the clause says, what these sitters need. */
function SeatBand({ pieceId }: { pieceId: string }) {
  const room = useRoomForFit();
  return (
    <FitViewContext value={room}>
      <SeatHeightBand document={room.document} pieceId={pieceId} />
    </FitViewContext>
  );
}

const bandLink = (pieceId: string, parameterKey: string) =>
  parameterKey === 'pressedSeatHeight' ? <SeatBand pieceId={pieceId} /> : null;

/** The room of a set, with its fit sheet at the foot. */
export function Component() {
  const { workshopId = '', productionId = '', setId = '' } = useParams();
  const path = useMemo(() => ({ workshopId, productionId, setId }), [workshopId, productionId, setId]);
  const pageTo = `/w/${workshopId}/p/${productionId}/sets/${setId}/fit`;
  return <RoomPage key={setId} path={path} bandLink={bandLink} foot={<RoomFoot pageTo={pageTo} />} />;
}
