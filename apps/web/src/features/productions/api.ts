import { keepPreviousData, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { SetDocument } from '@settlewright/geometry';
import { api } from '@/lib/api-client.ts';
import type { OrderSummary, Page, Production, SetSummary } from '@/lib/contract.ts';
import { productionKey, productionPath } from '@/lib/production.ts';

export type ProductionInput = Pick<Production, 'name' | 'summary' | 'units' | 'roundTo'>;

export interface ProductionFilter {
  status: 'active' | 'archived';
  search: string;
  page: number;
}

const listKey = (workshopId: string) => ['workshops', workshopId, 'productions'] as const;

export function useProductions(workshopId: string, filter: ProductionFilter) {
  return useQuery({
    queryKey: [...listKey(workshopId), 'list', filter],
    queryFn: ({ signal }) =>
      api.get<Page<Production>>(`/workshops/${workshopId}/productions`, {
        signal,
        query: { ...filter, pageSize: 24, sort: 'updatedAt', order: 'desc' },
      }),
    placeholderData: keepPreviousData,
  });
}

/** Any change to a production; the list and the production itself are read again. */
function useChange<Input, Answer>(workshopId: string, change: (input: Input) => Promise<Answer>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSuccess: () => client.invalidateQueries({ queryKey: listKey(workshopId) }),
  });
}

export const useCreateProduction = (workshopId: string) =>
  useChange(workshopId, (input: ProductionInput) =>
    api.post<Production>(`/workshops/${workshopId}/productions`, input),
  );

export const useChangeProduction = (workshopId: string, productionId: string) =>
  useChange(workshopId, (input: ProductionInput) =>
    api.patch<Production>(productionPath(workshopId, productionId), input),
  );

export type ProductionStep = 'duplicate' | 'archive' | 'restore';

export const useProductionStep = (workshopId: string) =>
  useChange(workshopId, ({ id, step }: { id: string; step: ProductionStep }) =>
    api.post<Production>(`${productionPath(workshopId, id)}/${step}`),
  );

const setsKey = (workshopId: string, productionId: string) =>
  [...productionKey(workshopId, productionId), 'sets'] as const;

export function useSets(workshopId: string, productionId: string, status: 'active' | 'archived') {
  return useQuery({
    queryKey: [...setsKey(workshopId, productionId), status],
    queryFn: ({ signal }) =>
      api.get<Page<SetSummary>>(`${productionPath(workshopId, productionId)}/sets`, {
        signal,
        query: { pageSize: 200, status },
      }),
  });
}

export function useAddSet(workshopId: string, productionId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: { name: string } & ({ arrangement: string } | { document: SetDocument })) =>
      api.post<SetSummary>(`${productionPath(workshopId, productionId)}/sets`, input),
    onSuccess: () => client.invalidateQueries({ queryKey: setsKey(workshopId, productionId) }),
  });
}

export type SetStep = { id: string; step: ProductionStep } | { id: string; step: 'rename'; name: string };

export function useSetStep(workshopId: string, productionId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: SetStep) => {
      const path = `${productionPath(workshopId, productionId)}/sets/${input.id}`;
      return input.step === 'rename'
        ? api.patch<SetSummary>(path, { name: input.name })
        : api.post<SetSummary>(`${path}/${input.step}`);
    },
    onSuccess: () => client.invalidateQueries({ queryKey: setsKey(workshopId, productionId) }),
  });
}

export function useOrders(workshopId: string, productionId: string) {
  return useQuery({
    queryKey: [...productionKey(workshopId, productionId), 'orders'],
    queryFn: ({ signal }) =>
      api.get<Page<OrderSummary>>(`${productionPath(workshopId, productionId)}/orders`, {
        signal,
        query: { pageSize: 200 },
      }),
  });
}
