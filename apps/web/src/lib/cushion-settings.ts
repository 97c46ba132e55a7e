import {
  cushionRules,
  NO_OWN_CUSHIONS,
  type CushionRules,
  type WorkshopCushions,
} from '@settlewright/geometry';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useMemo } from 'react';
import { api } from './api-client.ts';
import { workshopKey, workshopPath } from './workshop.ts';

export interface KeptCushionSettings {
  /** Raised by each change. */
  number: number;
  settings: WorkshopCushions;
  changedAt: string | null;
  changedByName: string | null;
}

const path = (workshopId: string) => `${workshopPath(workshopId)}/cushion-settings`;
const key = (workshopId: string) => [...workshopKey(workshopId), 'cushion-settings'] as const;

/** How the workshop makes cushions, where it differs from the usual way. */
export function useCushionSettings(workshopId: string) {
  return useQuery({
    queryKey: key(workshopId),
    queryFn: ({ signal }) => api.get<KeptCushionSettings>(path(workshopId), { signal }),
  });
}

/** Allowances and foams in force; the usual ones until the workshop's own are there. */
export function useCushionRules(workshopId: string): CushionRules {
  const settings = useCushionSettings(workshopId).data?.settings;
  return useMemo(() => cushionRules(settings ?? NO_OWN_CUSHIONS), [settings]);
}

export function useSaveCushionSettings(workshopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: { baseNumber: number; settings: WorkshopCushions }) =>
      api.put<KeptCushionSettings>(path(workshopId), input),
    onSuccess: (saved) => client.setQueryData(key(workshopId), saved),
  });
}
