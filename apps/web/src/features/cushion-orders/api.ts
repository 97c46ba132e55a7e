import type { OrderCover } from '@settlewright/geometry';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { api } from '@/lib/api-client.ts';
import type { OrderState, Page, Upholsterer } from '@/lib/contract.ts';
import { productionKey, productionPath } from '@/lib/production.ts';
import type { Order, OrderMessage, OrderSpec, PublicOrder } from './order.ts';

/** Where an order lives. */
export interface OrderPath {
  workshopId: string;
  productionId: string;
  orderId: string;
}

export const orderAddress = ({ workshopId, productionId, orderId }: OrderPath) =>
  `${productionPath(workshopId, productionId)}/orders/${orderId}`;

/** Mail goes out and answers come in while the page stands open, so it is read again in time. */
export const FOLLOWED = { refetchInterval: 30_000, refetchOnWindowFocus: 'always' } as const;

export const orderKey = ({ workshopId, productionId, orderId }: OrderPath) =>
  [...productionKey(workshopId, productionId), 'orders', orderId] as const;

export const useOrder = (path: OrderPath) =>
  useQuery({
    queryKey: orderKey(path),
    queryFn: ({ signal }) => api.get<Order>(orderAddress(path), { signal }),
    ...FOLLOWED,
  });

export const useMessages = (path: OrderPath, enabled: boolean) =>
  useQuery({
    queryKey: [...orderKey(path), 'messages'],
    queryFn: ({ signal }) =>
      api.get<Page<OrderMessage>>(`${orderAddress(path)}/messages`, { signal, query: { pageSize: 200 } }),
    enabled,
    ...FOLLOWED,
  });

/** Any change to an order; the order, its thread and the list are read again. */
function useOrderChange<Input>(path: OrderPath, change: (input: Input) => Promise<unknown>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSuccess: () =>
      client.invalidateQueries({
        queryKey: [...productionKey(path.workshopId, path.productionId), 'orders'],
      }),
  });
}

export interface OrderInput {
  title: string;
  revisionLetter: string;
  neededBy: string | null;
  cushionMarks: string[] | null;
  spec: OrderSpec;
  toleranceMm: number;
  covers: OrderCover[];
}

export const useChangeOrder = (path: OrderPath) =>
  useOrderChange(path, (input: Partial<OrderInput>) => api.patch(orderAddress(path), input));

export const useSendOrder = (path: OrderPath) =>
  useOrderChange(path, (input: { upholstererId: string; message: string }) =>
    api.post(`${orderAddress(path)}/send`, input),
  );

export const useRecordState = (path: OrderPath) =>
  useOrderChange(path, ({ to, note }: { to: OrderState; note: string }) =>
    to === 'cancelled'
      ? api.post(`${orderAddress(path)}/cancel`, { note })
      : api.post(`${orderAddress(path)}/state`, { to, note }),
  );

export const useWriteMessage = (path: OrderPath) =>
  useOrderChange(path, (text: string) => api.post(`${orderAddress(path)}/messages`, { text }));

export const useLinkStep = (path: OrderPath) =>
  useOrderChange(path, (step: 'renew' | 'revoke') => api.post(`${orderAddress(path)}/link/${step}`));

export const useMailAgain = (path: OrderPath) =>
  useOrderChange(path, () => api.post(`${orderAddress(path)}/mail/send-again`));

export function useCreateOrder(workshopId: string, productionId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: { setId: string; revisionLetter: string; title: string; neededBy: string | null }) =>
      api.post<Order>(`${productionPath(workshopId, productionId)}/orders`, input),
    onSuccess: () =>
      client.invalidateQueries({ queryKey: [...productionKey(workshopId, productionId), 'orders'] }),
  });
}

export interface IssuedSet {
  id: string;
  name: string;
  lastRevision?: { letter: string } | null;
}

export const useIssuedSets = (workshopId: string, productionId: string) =>
  useQuery({
    queryKey: [...productionKey(workshopId, productionId), 'sets', 'for-orders'],
    queryFn: ({ signal }) =>
      api.get<Page<IssuedSet>>(`${productionPath(workshopId, productionId)}/sets`, {
        signal,
        query: { pageSize: 200 },
      }),
  });

export const useAddressBook = (workshopId: string) =>
  useQuery({
    queryKey: ['workshops', workshopId, 'upholsterers'],
    queryFn: ({ signal }) =>
      api.get<Page<Upholsterer>>(`/workshops/${workshopId}/upholsterers`, {
        signal,
        query: { pageSize: 200 },
      }),
  });

export function useAddUpholsterer(workshopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: Pick<Upholsterer, 'name' | 'contactName' | 'email' | 'telephone' | 'notes'>) =>
      api.post<Upholsterer>(`/workshops/${workshopId}/upholsterers`, input),
    onSuccess: () => client.invalidateQueries({ queryKey: ['workshops', workshopId, 'upholsterers'] }),
  });
}

/** Where the order behind a private link is kept. */
export const publicKey = (token: string) => ['order-link', token] as const;
export const publicAddress = (token: string) => `/link/${encodeURIComponent(token)}`;

export const usePublicOrder = (token: string) =>
  useQuery({
    queryKey: publicKey(token),
    queryFn: ({ signal }) => api.get<PublicOrder>(publicAddress(token), { signal, anonymous: true }),
    retry: false,
    ...FOLLOWED,
  });

function usePublicStep<Input>(token: string, step: (input: Input) => Promise<PublicOrder>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: step,
    onSuccess: (order) => client.setQueryData(publicKey(token), order),
  });
}

export const useAcknowledge = (token: string) =>
  usePublicStep(token, (answer: { name: string; sentAt: string }) =>
    api.post<PublicOrder>(`${publicAddress(token)}/acknowledge`, answer, { anonymous: true }),
  );

export const useReply = (token: string) =>
  usePublicStep(token, (text: string) =>
    api.post<PublicOrder>(`${publicAddress(token)}/reply`, { text }, { anonymous: true }),
  );
