import { useParams } from 'react-router-dom';
import { UpholstererPage } from '@/features/cushion-orders/index.ts';

/** What the holder of a private link sees. */
export function Component() {
  const { token = '' } = useParams();
  return <UpholstererPage token={token} />;
}
