import { createContext, useContext } from 'react';
import type { Production } from './contract.ts';

export const ProductionContext = createContext<Production | null>(null);

/** The production of the address, already loaded; only for pages under `/p/:productionId`. */
export function useProduction(): Production {
  const production = useContext(ProductionContext);
  if (production === null) throw new Error('useProduction is used outside the pages of a production.');
  return production;
}

export const productionKey = (workshopId: string, productionId: string) =>
  ['workshops', workshopId, 'productions', productionId] as const;

export const productionPath = (workshopId: string, productionId: string) =>
  `/workshops/${workshopId}/productions/${productionId}`;
