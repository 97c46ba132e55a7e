import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { OrderPage } from '@/features/cushion-orders/index.ts';

/** One cushion order of a production. */
export function Component() {
  const { workshopId = '', productionId = '', orderId = '' } = useParams();
  const path = useMemo(() => ({ workshopId, productionId, orderId }), [workshopId, productionId, orderId]);
  return <OrderPage path={path} />;
}
