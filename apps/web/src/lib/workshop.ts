import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { api } from './api-client.ts';
import type { Role, Workshop } from './contract.ts';
import { useSession } from './session.ts';

export interface WorkshopAtHand {
  id: string;
  name: string;
  role: Role;
  isDemo: boolean;
  /** Owner and designer change productions, cast, sets and orders. */
  canEdit: boolean;
  /** The owner alone keeps members and settings. */
  isOwner: boolean;
}

/** The workshop of the address; only for pages under `/w/:workshopId`, whose route has checked the membership. */
export function useWorkshop(): WorkshopAtHand {
  const { workshopId } = useParams();
  const found = useSession((state) => state.workshops.find((workshop) => workshop.id === workshopId));
  if (found === undefined) throw new Error('useWorkshop is used outside the pages of a workshop.');
  return {
    ...found,
    canEdit: found.role === 'owner' || found.role === 'designer',
    isOwner: found.role === 'owner',
  };
}

export const workshopPath = (workshopId: string) => `/workshops/${workshopId}`;
export const workshopKey = (workshopId: string) => ['workshops', workshopId] as const;
export const settingsKey = (workshopId: string) => [...workshopKey(workshopId), 'settings'] as const;

/** What the owner set for the whole workshop. */
export function useWorkshopSettings(workshopId: string) {
  return useQuery({
    queryKey: settingsKey(workshopId),
    queryFn: ({ signal }) => api.get<Workshop>(workshopPath(workshopId), { signal }),
  });
}
