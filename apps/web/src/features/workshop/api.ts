import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { api } from '@/lib/api-client.ts';
import { settingsKey, workshopKey, workshopPath } from '@/lib/workshop.ts';
import type { Invitation, Member, Page, Role, Upholsterer, Workshop } from '@/lib/contract.ts';

const path = workshopPath;
const key = (workshopId: string, part: string) => [...workshopKey(workshopId), part] as const;

export function useMembers(workshopId: string) {
  return useQuery({
    queryKey: key(workshopId, 'members'),
    queryFn: ({ signal }) =>
      api.get<Page<Member>>(`${path(workshopId)}/members`, { signal, query: { pageSize: 200 } }),
  });
}

export function useInvitations(workshopId: string, enabled: boolean) {
  return useQuery({
    queryKey: key(workshopId, 'invitations'),
    queryFn: ({ signal }) =>
      api.get<Page<Invitation>>(`${path(workshopId)}/invitations`, { signal, query: { pageSize: 200 } }),
    enabled,
  });
}

export function useUpholsterers(workshopId: string) {
  return useQuery({
    queryKey: key(workshopId, 'upholsterers'),
    queryFn: ({ signal }) =>
      api.get<Page<Upholsterer>>(`${path(workshopId)}/upholsterers`, { signal, query: { pageSize: 200 } }),
  });
}

/** A change to one part of the workshop, after which that part is read again. */
function useChange<Input, Answer = void>(
  workshopId: string,
  part: string,
  change: (input: Input) => Promise<Answer>,
) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSuccess: () => client.invalidateQueries({ queryKey: key(workshopId, part) }),
  });
}

type Settings = Pick<Workshop, 'name' | 'telephone' | 'paper' | 'timeZone' | 'confidence'>;

/** Settings reach what the server counts and prints, so everything of the workshop is read again. */
export function useSaveSettings(workshopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: Partial<Settings>) => api.patch<Workshop>(path(workshopId), input),
    onSuccess: (saved) => {
      client.setQueryData(settingsKey(workshopId), saved);
      return client.invalidateQueries({ queryKey: workshopKey(workshopId) });
    },
  });
}

export const useChangeRole = (workshopId: string) =>
  useChange(workshopId, 'members', ({ userId, role }: { userId: string; role: Role }) =>
    api.patch<Member>(`${path(workshopId)}/members/${userId}`, { role }),
  );

export const useRemoveMember = (workshopId: string) =>
  useChange(workshopId, 'members', (userId: string) => api.delete(`${path(workshopId)}/members/${userId}`));

export const useInvite = (workshopId: string) =>
  useChange(workshopId, 'invitations', (input: { email: string; role: Role }) =>
    api.post<Invitation>(`${path(workshopId)}/invitations`, input),
  );

export const useWithdrawInvitation = (workshopId: string) =>
  useChange(workshopId, 'invitations', (id: string) => api.delete(`${path(workshopId)}/invitations/${id}`));

export type UpholstererInput = Omit<Upholsterer, 'id' | 'createdAt'>;

export const useSaveUpholsterer = (workshopId: string) =>
  useChange(workshopId, 'upholsterers', ({ id, ...input }: UpholstererInput & { id?: string }) =>
    id === undefined
      ? api.post<Upholsterer>(`${path(workshopId)}/upholsterers`, input)
      : api.patch<Upholsterer>(`${path(workshopId)}/upholsterers/${id}`, input),
  );

export const useRemoveUpholsterer = (workshopId: string) =>
  useChange(workshopId, 'upholsterers', (id: string) => api.delete(`${path(workshopId)}/upholsterers/${id}`));
