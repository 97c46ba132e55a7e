import { useParams } from 'react-router-dom';
import { useSession } from '@/lib/session.ts';

/** Where the brand leads: the workshop at hand, else the first one. */
export function useHome(): string {
  const { workshopId } = useParams();
  const first = useSession((state) => state.workshops[0]?.id);
  const id = workshopId ?? first;
  return id === undefined ? '/account' : `/w/${id}`;
}
