import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { render } from '@testing-library/react';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { useConnection } from '@/lib/connection.ts';
import { useSession } from '@/lib/session.ts';
import { registerUnsentWork } from '@/lib/unsent-work.ts';
import { signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { Shell } from './shell.tsx';

function show(at: string) {
  const router = createMemoryRouter(
    [
      {
        element: <Shell />,
        children: [
          { path: '/w/:workshopId', element: <h1>Productions</h1> },
          {
            path: '/w/:workshopId/workshop',
            element: (
              <h1 tabIndex={-1} data-page-heading>
                Members
              </h1>
            ),
          },
        ],
      },
      { path: '/sign-in', element: <p>the way in</p> },
    ],
    { initialEntries: [at] },
  );
  render(<RouterProvider router={router} />);
  return router;
}

describe('Shell', () => {
  beforeEach(() => {
    window.scrollTo = vi.fn() as typeof window.scrollTo;
    useConnection.setState({ reachable: true });
  });

  it('sends a stranger to the way in and remembers the page that was asked for', async () => {
    useSession.setState({ status: 'signed-out', accessToken: null, user: null, workshops: [] });
    const router = show(`/w/${WORKSHOP_ID}/workshop?x=1`);
    expect(await screen.findByText('the way in')).toBeVisible();
    expect(new URLSearchParams(router.state.location.search).get('back')).toBe(
      `/w/${WORKSHOP_ID}/workshop?x=1`,
    );
  });

  it('moves the focus to the heading of the page that opens', async () => {
    signInAs('owner');
    const router = show(`/w/${WORKSHOP_ID}`);
    await router.navigate(`/w/${WORKSHOP_ID}/workshop`);
    await waitFor(() => expect(screen.getByRole('heading', { name: 'Members' })).toHaveFocus());
  });

  it('says that the server is gone and takes it back when it answers', async () => {
    signInAs('owner');
    show(`/w/${WORKSHOP_ID}`);
    useConnection.setState({ reachable: false });
    expect(await screen.findByText(/can’t be reached/)).toBeVisible();
    server.use(http.get('*/api/health/live', () => HttpResponse.json({})));
    window.dispatchEvent(new Event('online'));
    await waitFor(() => expect(screen.queryByText(/can’t be reached/)).toBeNull());
  });

  it('warns of unsent work before signing out, and wipes it only then', async () => {
    signInAs('owner');
    let signedOut = 0;
    const wipe = vi.fn();
    const forget = registerUnsentWork({
      pending: () => true,
      describe: () => '3 changes to Dining car',
      wipe,
    });
    server.use(
      http.post('*/api/auth/sign-out', () => {
        signedOut += 1;
        return new HttpResponse(null, { status: 204 });
      }),
    );
    show(`/w/${WORKSHOP_ID}`);
    await userEvent.click(screen.getByRole('button', { name: /Signed in: Nell Abara, owner/ }));
    await userEvent.click(await screen.findByRole('menuitem', { name: 'Sign out' }));
    expect(await screen.findByText('3 changes to Dining car')).toBeVisible();
    expect([signedOut, wipe.mock.calls.length]).toEqual([0, 0]);
    await userEvent.click(screen.getByRole('button', { name: 'Sign out and wipe it' }));
    expect(await screen.findByText('the way in')).toBeVisible();
    expect([signedOut, wipe.mock.calls.length]).toEqual([1, 1]);
    expect(useSession.getState().user).toBeNull();
    forget();
  });
});
