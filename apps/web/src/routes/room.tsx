import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { RoomPage } from '@/features/room/index.ts';

/** The room of a set, with its fit sheet at the foot. */
export function Component() {
  const { workshopId = '', productionId = '', setId = '' } = useParams();
  const path = useMemo(() => ({ workshopId, productionId, setId }), [workshopId, productionId, setId]);
  return <RoomPage key={setId} path={path} />;
}
