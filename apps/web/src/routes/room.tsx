import { dimensionIdOf } from '@settlewright/geometry';
import { useMemo } from 'react';
import { Link, useParams } from 'react-router-dom';
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

/** The way to the bands of everybody along this number. */
function WayToStick({ pieceId, parameterKey }: { pieceId: string; parameterKey: string }) {
  const { workshopId, productionId, setId } = useParams();
  const { document } = useRoomForFit();
  const dimension = dimensionIdOf(document, pieceId, parameterKey);
  if (dimension === undefined) return null;
  const to = `/w/${workshopId}/p/${productionId}/sets/${setId}/stick?d=${encodeURIComponent(dimension)}`;
  return (
    // A press must not end the edit before the page turns.
    <Link className="link whitespace-nowrap" to={to} onMouseDown={(event) => event.preventDefault()}>
      See the band
    </Link>
  );
}

const bandLink = (pieceId: string, parameterKey: string) => (
  <>
    <WayToStick pieceId={pieceId} parameterKey={parameterKey} />
    {parameterKey === 'pressedSeatHeight' && <SeatBand pieceId={pieceId} />}
  </>
);

/** The room of a set, with its fit sheet at the foot. */
export function Component() {
  const { workshopId = '', productionId = '', setId = '' } = useParams();
  const path = useMemo(() => ({ workshopId, productionId, setId }), [workshopId, productionId, setId]);
  const pageTo = `/w/${workshopId}/p/${productionId}/sets/${setId}/fit`;
  return <RoomPage key={setId} path={path} bandLink={bandLink} foot={<RoomFoot pageTo={pageTo} />} />;
}
