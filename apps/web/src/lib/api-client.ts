import { noteReachable } from './connection.ts';
import type { Session } from './contract.ts';
import { Problem, readProblem, Unreachable } from './problem.ts';
import { dropSession, takeSession, useSession } from './session.ts';

export interface RequestOptions {
  body?: unknown;
  query?: Record<string, string | number | boolean | undefined>;
  signal?: AbortSignal;
  /** Public pages and the sign-in itself send no token and never refresh. */
  anonymous?: boolean;
}

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

function address(path: string, query: RequestOptions['query']): string {
  const search = new URLSearchParams();
  for (const [key, value] of Object.entries(query ?? {})) {
    if (value !== undefined && value !== '') search.set(key, String(value));
  }
  const text = search.toString();
  return `${window.location.origin}/api${path}${text === '' ? '' : `?${text}`}`;
}

function bodyOf(body: unknown): BodyInit | undefined {
  if (body === undefined || body instanceof FormData) return body;
  return JSON.stringify(body);
}

async function send(
  method: Method,
  path: string,
  options: RequestOptions,
  token: string | null,
): Promise<Response> {
  const headers = new Headers({ Accept: 'application/json' });
  // Of a form the browser writes the type itself, with the line between its parts.
  if (options.body !== undefined && !(options.body instanceof FormData))
    headers.set('Content-Type', 'application/json');
  if (token !== null) headers.set('Authorization', `Bearer ${token}`);
  try {
    const response = await fetch(address(path, options.query), {
      method,
      headers,
      credentials: 'same-origin',
      body: bodyOf(options.body),
      signal: options.signal,
    });
    // A gateway that answers for a server which is down says nothing about what was typed.
    const down = response.status === 502 || response.status === 503 || response.status === 504;
    noteReachable(!down);
    return response;
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    noteReachable(false);
    throw new Unreachable();
  }
}

let refreshing: Promise<boolean> | null = null;

/** Two tabs share one refresh token: the lock lets one ask, the other takes over what it received. */
async function refreshOnce(staleToken: string | null): Promise<boolean> {
  const ask = async (): Promise<boolean> => {
    const { accessToken } = useSession.getState();
    if (accessToken !== null && accessToken !== staleToken) return true;
    const response = await send('POST', '/auth/refresh', {}, null);
    if (response.ok) {
      takeSession((await response.json()) as Session);
      return true;
    }
    if (response.status === 401 || response.status === 403) dropSession();
    return false;
  };
  return 'locks' in navigator ? navigator.locks.request('settlewright.refresh', ask) : ask();
}

/** Asks for a new access token; every caller of the moment shares one request. */
export function refreshSession(): Promise<boolean> {
  refreshing ??= refreshOnce(useSession.getState().accessToken).finally(() => {
    refreshing = null;
  });
  return refreshing;
}

async function answer(method: Method, path: string, options: RequestOptions): Promise<Response> {
  if (options.anonymous) return send(method, path, options, null);
  const token = useSession.getState().accessToken;
  const response = await send(method, path, options, token);
  if (response.status !== 401) return response;
  const refreshed = await refreshSession();
  return refreshed ? send(method, path, options, useSession.getState().accessToken) : response;
}

async function request<T>(method: Method, path: string, options: RequestOptions = {}): Promise<T> {
  const response = await answer(method, path, options);
  if (!response.ok) throw await readProblem(response);
  if (response.status === 204 || response.status === 202) return undefined as T;
  const text = await response.text();
  return (text === '' ? undefined : JSON.parse(text)) as T;
}

/** Calls the server under `/api`; throws `Problem` or `Unreachable`. */
export const api = {
  get: <T>(path: string, options?: RequestOptions) => request<T>('GET', path, options),
  post: <T>(path: string, body?: unknown, options?: RequestOptions) =>
    request<T>('POST', path, { ...options, body }),
  put: <T>(path: string, body?: unknown, options?: RequestOptions) =>
    request<T>('PUT', path, { ...options, body }),
  patch: <T>(path: string, body?: unknown, options?: RequestOptions) =>
    request<T>('PATCH', path, { ...options, body }),
  delete: <T = void>(path: string, options?: RequestOptions) => request<T>('DELETE', path, options),
  /** A file with its name as the server gives it; with a body it is asked for by POST. */
  file: async (path: string, options?: RequestOptions): Promise<{ blob: Blob; name: string }> => {
    const method = options?.body === undefined ? 'GET' : 'POST';
    const response = await answer(method, path, options ?? {});
    if (!response.ok) throw await readProblem(response);
    const named = /filename="?([^";]+)"?/.exec(response.headers.get('Content-Disposition') ?? '');
    return { blob: await response.blob(), name: named?.[1] ?? path.split('/').at(-1) ?? 'file' };
  },
};

export { Problem, Unreachable };
