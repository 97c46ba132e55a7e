import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { ComparePage } from '@/features/room/index.ts';

/** Two versions of a set side by side. */
export function Component() {
  const { workshopId = '', productionId = '', setId = '' } = useParams();
  const path = useMemo(() => ({ workshopId, productionId, setId }), [workshopId, productionId, setId]);
  return <ComparePage key={setId} path={path} />;
}
