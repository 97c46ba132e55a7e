import { Navigate } from 'react-router-dom';
import { useHome } from './use-home.ts';

export function HomeRedirect() {
  return <Navigate to={useHome()} replace />;
}
