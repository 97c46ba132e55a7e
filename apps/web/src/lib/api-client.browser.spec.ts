import { http, HttpResponse } from 'msw';
import { beforeEach, describe, expect, it } from 'vitest';
import { server } from '@/test/server.ts';
import { api } from './api-client.ts';
import { useConnection } from './connection.ts';
import { Problem, Unreachable } from './problem.ts';
import { useSession } from './session.ts';

const SESSION = {
  accessToken: 'fresh',
  expiresInSeconds: 600,
  user: { id: 'u1', name: 'Nell Abara', email: 'nell@ropewalk.example', emailConfirmed: true },
  workshops: [],
};

const guarded = http.get('*/api/things', ({ request }) =>
  request.headers.get('Authorization') === 'Bearer fresh'
    ? HttpResponse.json({ items: [1] })
    : HttpResponse.json({ status: 401, code: 'not-signed-in', title: 'No' }, { status: 401 }),
);

describe('api client', () => {
  beforeEach(() => {
    useSession.setState({ status: 'signed-in', accessToken: 'stale', user: SESSION.user, workshops: [] });
    useConnection.setState({ reachable: true });
  });

  it('refreshes once for all requests that meet an expired token, then repeats them', async () => {
    let refreshes = 0;
    server.use(
      guarded,
      http.post('*/api/auth/refresh', () => {
        refreshes += 1;
        return HttpResponse.json(SESSION);
      }),
    );
    const answers = await Promise.all([api.get('/things'), api.get('/things'), api.get('/things')]);
    expect(answers).toEqual([{ items: [1] }, { items: [1] }, { items: [1] }]);
    expect(refreshes).toBe(1);
    expect(useSession.getState().accessToken).toBe('fresh');
  });

  it('ends the session when the refresh is refused, and does not try for ever', async () => {
    let asked = 0;
    server.use(
      http.get('*/api/things', () => {
        asked += 1;
        return new HttpResponse(null, { status: 401 });
      }),
      http.post('*/api/auth/refresh', () => new HttpResponse(null, { status: 401 })),
    );
    await expect(api.get('/things')).rejects.toMatchObject({ status: 401 });
    expect(asked).toBe(1);
    expect(useSession.getState().status).toBe('signed-out');
  });

  it('turns a problem answer into its words and fields', async () => {
    server.use(
      http.post('*/api/things', () =>
        HttpResponse.json(
          {
            status: 400,
            code: 'invalid-request',
            title: 'Bad Request',
            detail: 'Some of what was sent cannot be used.',
            fields: [{ path: 'name', code: 'too-long', message: 'At most 120 characters.' }],
          },
          { status: 400 },
        ),
      ),
    );
    const error: unknown = await api.post('/things', {}).catch((thrown: unknown) => thrown);
    expect(error).toBeInstanceOf(Problem);
    expect(error).toMatchObject({
      code: 'invalid-request',
      message: 'Some of what was sent cannot be used.',
      fields: [{ path: 'name', message: 'At most 120 characters.' }],
    });
  });

  it('notes that the server is gone, and that it is back', async () => {
    server.use(http.get('*/api/things', () => HttpResponse.error()));
    await expect(api.get('/things')).rejects.toBeInstanceOf(Unreachable);
    expect(useConnection.getState().reachable).toBe(false);
    server.use(http.get('*/api/things', () => HttpResponse.json({})));
    await api.get('/things');
    expect(useConnection.getState().reachable).toBe(true);
  });
});
