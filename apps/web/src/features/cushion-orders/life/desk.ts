import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { api } from '@/lib/api-client.ts';
import type { OrderLife } from '@/lib/contract.ts';
import { productionKey } from '@/lib/production.ts';
import { FOLLOWED, orderAddress, orderKey, publicAddress, publicKey, type OrderPath } from '../api.ts';

/** Which side sits at the order: the workshop, signed in, or the upholsterer, by the private link. */
export type Desk = { side: 'workshop'; path: OrderPath } | { side: 'upholsterer'; token: string };

export type Quote = OrderLife['quotes'][number];
export type Question = OrderLife['questions'][number];
export type OrderFile = OrderLife['files'][number];
export type Payment = OrderLife['payments'][number];
export type Inspection = OrderLife['inspections'][number];

const addressOf = (desk: Desk) =>
  desk.side === 'workshop' ? orderAddress(desk.path) : publicAddress(desk.token);
const keyOf = (desk: Desk) => [
  ...(desk.side === 'workshop' ? orderKey(desk.path) : publicKey(desk.token)),
  'life',
];
const anonymousAt = (desk: Desk) => desk.side === 'upholsterer';

export const useLife = (desk: Desk, enabled = true) =>
  useQuery({
    queryKey: keyOf(desk),
    queryFn: ({ signal }) =>
      api.get<OrderLife>(`${addressOf(desk)}/life`, { signal, anonymous: anonymousAt(desk) }),
    enabled,
    ...FOLLOWED,
  });

/** A step at this side; its answer is the life as it stands then, and the order itself is read again. */
function useStep<Input>(desk: Desk, step: (input: Input) => Promise<OrderLife>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: step,
    onSuccess: async (life) => {
      client.setQueryData(keyOf(desk), life);
      await client.invalidateQueries({
        queryKey:
          desk.side === 'workshop'
            ? [...productionKey(desk.path.workshopId, desk.path.productionId), 'orders']
            : publicKey(desk.token),
      });
    },
  });
}

/** One of the steps that are posted below the order, as `quotes/…/accept`. */
export const useLifeStep = (desk: Desk) =>
  useStep(desk, ({ step, body }: { step: string; body?: object }) =>
    api.post<OrderLife>(`${addressOf(desk)}/${step}`, body, { anonymous: anonymousAt(desk) }),
  );

export const useAddFile = (desk: Desk) =>
  useStep(desk, ({ file, cushionMark }: { file: File; cushionMark: string | null }) => {
    const form = new FormData();
    if (cushionMark !== null) form.set('cushionMark', cushionMark);
    form.set('file', file);
    return api.post<OrderLife>(`${addressOf(desk)}/files`, form, { anonymous: anonymousAt(desk) });
  });

export const useRemoveFile = (desk: Desk) =>
  useStep(desk, (id: string) =>
    api.delete<OrderLife>(`${addressOf(desk)}/files/${id}`, { anonymous: anonymousAt(desk) }),
  );

const fileAddress = (desk: Desk, id: string) => `${addressOf(desk)}/files/${id}`;

/** The bytes of a file under an address of this page alone; a picture cannot send the session's token itself. */
export const useFileUrl = (desk: Desk, id: string, wanted: boolean) =>
  useQuery({
    queryKey: [...keyOf(desk), 'file', id],
    queryFn: async () => {
      const { blob } = await api.file(fileAddress(desk, id), { anonymous: anonymousAt(desk) });
      return URL.createObjectURL(blob);
    },
    enabled: wanted,
    staleTime: Infinity,
    gcTime: Infinity,
  });

export const openFile = (desk: Desk, id: string) =>
  api.file(fileAddress(desk, id), { anonymous: anonymousAt(desk) });

/** The payment provider's page for a deposit. */
export const useBeginDeposit = (path: OrderPath) =>
  useMutation({
    mutationFn: (amountMinor: number) =>
      api.post<{ url: string }>(`${orderAddress(path)}/payments/checkout`, { amountMinor }),
  });
