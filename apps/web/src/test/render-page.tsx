import { QueryClientProvider } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import type { ReactElement } from 'react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import type { Membership } from '@/lib/contract.ts';
import { ProductionContext } from '@/lib/production.ts';
import { createQueryClient } from '@/lib/query-client.ts';
import { useSession } from '@/lib/session.ts';

export const WORKSHOP_ID = '6b1f0c5e-1a0e-4c53-9a55-0a3d6f6f9a01';
export const PRODUCTION_ID = '6b1f0c5e-1a0e-4c53-9a55-0a3d6f6f9a02';

/** Signs somebody in without the server. */
export function signInAs(role: Membership['role']): void {
  useSession.setState({
    status: 'signed-in',
    accessToken: 'token-1',
    user: { id: 'u1', name: 'Nell Abara', email: 'nell@ropewalk.example', emailConfirmed: true },
    workshops: [{ id: WORKSHOP_ID, name: 'Ropewalk Scenic', role, isDemo: false }],
  });
}

const PRODUCTION = {
  id: PRODUCTION_ID,
  name: 'Supper at Larch Junction',
  summary: '',
  units: 'feet-inches',
  roundTo: 8,
  status: 'active',
  createdAt: '2026-01-20T10:00:00Z',
  updatedAt: '2026-01-20T10:00:00Z',
} as const;

/** Renders one page inside router, queries and production, as the application does. */
export function renderPage(element: ReactElement, { path = '/', at = '/' } = {}) {
  const router = createMemoryRouter(
    [
      { path, element: <ProductionContext value={PRODUCTION}>{element}</ProductionContext> },
      { path: '*', element: <p>another page</p> },
    ],
    { initialEntries: [at] },
  );
  const view = render(
    <QueryClientProvider client={createQueryClient()}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  return { router, ...view };
}
