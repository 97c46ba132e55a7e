import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { RevisionsPage } from '@/features/room/index.ts';

/** Issued revisions of a set. */
export function Component() {
  const { workshopId = '', productionId = '', setId = '' } = useParams();
  const path = useMemo(() => ({ workshopId, productionId, setId }), [workshopId, productionId, setId]);
  return <RevisionsPage key={setId} path={path} />;
}
