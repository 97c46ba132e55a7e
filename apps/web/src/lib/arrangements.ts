import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { readSetDocument, type SetDocument } from '@settlewright/geometry';
import { api } from './api-client.ts';
import type { KeptArrangement, Page } from './contract.ts';
import { workshopKey, workshopPath } from './workshop.ts';

const key = (workshopId: string) => [...workshopKey(workshopId), 'arrangements'] as const;
const path = (workshopId: string) => `${workshopPath(workshopId)}/arrangements`;

/** Those that this version can read; older ones are brought up to date. */
const readable = ({ items }: Page<KeptArrangement>): KeptArrangement[] =>
  items.flatMap((item) => {
    const read = readSetDocument(item.document);
    return read.ok ? [{ ...item, document: read.value }] : [];
  });

/** Pieces that the workshop keeps to begin other sets with. */
export function useArrangements(workshopId: string, enabled: boolean) {
  return useQuery({
    queryKey: key(workshopId),
    queryFn: ({ signal }) =>
      api.get<Page<KeptArrangement>>(path(workshopId), { signal, query: { pageSize: 200 } }),
    select: readable,
    enabled,
  });
}

function useChange<Input, Answer>(workshopId: string, change: (input: Input) => Promise<Answer>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSuccess: () => client.invalidateQueries({ queryKey: key(workshopId) }),
  });
}

export const useKeepArrangement = (workshopId: string) =>
  useChange(workshopId, (input: { name: string; document: SetDocument }) =>
    api.post<KeptArrangement>(path(workshopId), input),
  );

export const useRemoveArrangement = (workshopId: string) =>
  useChange(workshopId, (id: string) => api.delete(`${path(workshopId)}/${id}`));
