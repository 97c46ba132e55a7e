import { useQuery } from '@tanstack/react-query';
import { api } from '@/lib/api-client';
import type { NewTestSit, Page, TestSit } from '@/lib/contract';
import { keyOf, LONG_PAGE, setAddress, useSetMutation, type SetPath } from '../api.ts';

const address = (path: SetPath): string => `${setAddress(path)}/test-sits`;
const LATEST_FIRST = { ...LONG_PAGE, sort: 'satOn', order: 'desc' } as const;

export const useTestSits = (path: SetPath) =>
  useQuery({
    queryKey: keyOf(path, 'test-sits'),
    queryFn: async () => (await api.get<Page<TestSit>>(address(path), { query: LATEST_FIRST })).items,
  });

export const useAddTestSit = (path: SetPath) =>
  useSetMutation(path, (sit: NewTestSit) => api.post<TestSit>(address(path), sit), 'test-sits');

export const useRemoveTestSit = (path: SetPath) =>
  useSetMutation(path, (id: string) => api.delete(`${address(path)}/${id}`), 'test-sits');
