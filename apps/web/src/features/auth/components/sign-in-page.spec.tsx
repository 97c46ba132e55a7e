import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { beforeEach, describe, expect, it } from 'vitest';
import { useSession } from '@/lib/session.ts';
import { renderPage } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { SignInPage } from './sign-in-page.tsx';

const show = (at = '/sign-in') => renderPage(<SignInPage />, { path: '/sign-in', at });

async function fill(email: string, password: string) {
  if (email) await userEvent.type(screen.getByLabelText('E-mail'), email);
  if (password) await userEvent.type(screen.getByLabelText('Password'), password);
  await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
}

describe('SignInPage', () => {
  beforeEach(() => {
    useSession.setState({ status: 'signed-out', accessToken: null, user: null, workshops: [] });
  });

  it('asks for what is missing beside the field and sends nothing', async () => {
    show();
    await fill('nell', '');
    expect(await screen.findByText('An e-mail address looks like name@workshop.example.')).toBeVisible();
    expect(screen.getByLabelText('E-mail')).toHaveAttribute('aria-invalid', 'true');
    expect(screen.getByLabelText('Password')).toHaveAccessibleDescription(/Type your password/);
  });

  it('says that the pair is wrong without saying which half, and keeps what was typed', async () => {
    server.use(
      http.post('*/api/auth/sign-in', () =>
        HttpResponse.json({ status: 401, code: 'wrong-credentials', title: 'Unauthorized' }, { status: 401 }),
      ),
    );
    show();
    await fill('nell@ropewalk.example', 'not the one');
    expect(await screen.findByRole('alert')).toHaveTextContent('do not belong together');
    expect(screen.getByLabelText('E-mail')).toHaveValue('nell@ropewalk.example');
    await waitFor(() => expect(screen.getByLabelText('Password')).toHaveFocus());
  });

  it('goes back to the page that was asked for, but never to another site', async () => {
    server.use(
      http.post('*/api/auth/sign-in', () =>
        HttpResponse.json({
          accessToken: 'a',
          expiresInSeconds: 600,
          user: { id: 'u1', name: 'Nell', email: 'nell@ropewalk.example', emailConfirmed: true },
          workshops: [],
        }),
      ),
    );
    const { router } = show('/sign-in?back=%2Fw%2F1%2Fp%2F2');
    await fill('nell@ropewalk.example', 'larch-junction');
    await waitFor(() => expect(router.state.location.pathname).toBe('/w/1/p/2'));

    const other = show('/sign-in?back=%2F%2Felsewhere.example');
    await waitFor(() => expect(other.router.state.location.pathname).toBe('/'));
  });
});
