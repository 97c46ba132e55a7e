import { useQuery } from '@tanstack/react-query';
import { useEffect, useMemo } from 'react';
import { Outlet, useParams } from 'react-router-dom';
import { LoadingLine } from '@/components/loading.tsx';
import { api } from '@/lib/api-client.ts';
import type { Production } from '@/lib/contract.ts';
import { ProductionContext, productionKey, productionPath } from '@/lib/production.ts';
import { type TitleCell, useTitleCells } from '@/lib/title-cells.ts';
import { setProductionUnits } from '@/lib/unit-choice.ts';
import { useWorkshop } from '@/lib/workshop.ts';

function ProductionFrame({ production, workshopId }: { production: Production; workshopId: string }) {
  const home = `/w/${workshopId}/p/${production.id}`;
  const { setId } = useParams();
  const cells = useMemo<TitleCell[]>(
    () => [
      {
        id: 'production',
        side: 'left',
        order: 20,
        label: production.status === 'archived' ? 'Production, archived' : 'Production',
        value: production.name,
        name: `Production: ${production.name}, menu`,
        shortens: true,
        yields: setId === undefined ? undefined : 20,
        menu: [
          { id: 'page', words: 'Sets and orders', to: home },
          { id: 'people', words: 'People', to: `${home}/people` },
        ],
      },
    ],
    [home, production.name, production.status, setId],
  );
  useTitleCells(cells);

  const { units, roundTo } = production;
  useEffect(() => {
    setProductionUnits({ system: units, roundTo });
    return () => setProductionUnits(null);
  }, [units, roundTo]);

  return (
    <ProductionContext value={production}>
      <Outlet />
    </ProductionContext>
  );
}

/** Loads the production once for all its pages and sets its units. */
export function Component() {
  const workshop = useWorkshop();
  const { productionId = '' } = useParams();
  const production = useQuery({
    queryKey: productionKey(workshop.id, productionId),
    queryFn: ({ signal }) => api.get<Production>(productionPath(workshop.id, productionId), { signal }),
    throwOnError: (_error, query) => query.state.data === undefined,
  });
  if (production.data === undefined) {
    return (
      <div className="page">
        <LoadingLine words="Opening the production" />
      </div>
    );
  }
  return <ProductionFrame production={production.data} workshopId={workshop.id} />;
}
