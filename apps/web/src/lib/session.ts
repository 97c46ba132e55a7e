import { create } from 'zustand';
import type { Membership, Session, SessionUser } from './contract.ts';

/** `unknown` until the first refresh has answered. */
export type SessionStatus = 'unknown' | 'signed-in' | 'signed-out';

interface SessionState {
  status: SessionStatus;
  accessToken: string | null;
  user: SessionUser | null;
  workshops: Membership[];
}

const SIGNED_OUT: SessionState = { status: 'signed-out', accessToken: null, user: null, workshops: [] };

/** The token lives in memory only: a script that steals storage finds nothing. */
export const useSession = create<SessionState>(() => ({ ...SIGNED_OUT, status: 'unknown' }));

const HINT = 'settlewright.was-signed-in';

/** Says whether a refresh is worth asking for; it is a hint, no proof of anything. */
export function mayHaveSession(): boolean {
  try {
    return localStorage.getItem(HINT) === '1';
  } catch {
    return true;
  }
}

function remember(signedIn: boolean): void {
  try {
    if (signedIn) localStorage.setItem(HINT, '1');
    else localStorage.removeItem(HINT);
  } catch {
    // Without storage every start asks the server, which is right as well.
  }
}

type Message = { kind: 'session'; session: Session } | { kind: 'signed-out' };

const channel = typeof BroadcastChannel === 'undefined' ? null : new BroadcastChannel('settlewright.session');

function apply(session: Session): void {
  useSession.setState({
    status: 'signed-in',
    accessToken: session.accessToken,
    user: session.user,
    workshops: session.workshops,
  });
  remember(true);
}

/** Takes a session this tab has received and hands it to the other tabs. */
export function takeSession(session: Session): void {
  apply(session);
  channel?.postMessage({ kind: 'session', session } satisfies Message);
}

/** Forgets the session in this tab and the others. */
export function dropSession(): void {
  useSession.setState(SIGNED_OUT);
  remember(false);
  channel?.postMessage({ kind: 'signed-out' } satisfies Message);
}

/** The page opened without a session, or the server could not say. */
export function markSignedOut(): void {
  useSession.setState(SIGNED_OUT);
}

channel?.addEventListener('message', (event: MessageEvent<Message>) => {
  if (event.data.kind === 'signed-out') {
    useSession.setState(SIGNED_OUT);
    return;
  }
  // A tab on which nobody is signed in stays as it is until it asks for itself.
  const { user } = useSession.getState();
  if (user === null || user.id === event.data.session.user.id) apply(event.data.session);
});

/** The role in one workshop, or null for somebody who is not a member. */
export function useRole(workshopId: string | undefined): Membership['role'] | null {
  return useSession((state) => state.workshops.find((workshop) => workshop.id === workshopId)?.role ?? null);
}
