import { useMutation, useQuery } from '@tanstack/react-query';
import { api } from '@/lib/api-client.ts';
import type { InvitationOffer, Session, SessionUser, Workshop } from '@/lib/contract.ts';
import { takeSession, useSession } from '@/lib/session.ts';

const public_ = { anonymous: true } as const;

export function useSignIn() {
  return useMutation({
    mutationFn: (input: { email: string; password: string }) =>
      api.post<Session>('/auth/sign-in', input, public_),
    onSuccess: takeSession,
  });
}

export function useSignUp() {
  return useMutation({
    mutationFn: (input: { name: string; email: string; password: string; workshopName: string }) =>
      api.post<Session>('/auth/sign-up', input, public_),
    onSuccess: takeSession,
  });
}

export function useAskForReset() {
  return useMutation({
    mutationFn: (input: { email: string }) => api.post<void>('/auth/password-reset', input, public_),
  });
}

export function useResetPassword() {
  return useMutation({
    mutationFn: (input: { token: string; password: string }) =>
      api.post<void>('/auth/password-reset/confirm', input, public_),
  });
}

export function useConfirmEmail() {
  return useMutation({
    mutationFn: (token: string) => api.post<void>('/auth/email/confirm', { token }, public_),
    onSuccess: () => {
      const { user } = useSession.getState();
      if (user !== null) useSession.setState({ user: { ...user, emailConfirmed: true } });
    },
  });
}

export function useResendConfirmation() {
  return useMutation({ mutationFn: () => api.post<void>('/auth/email/resend') });
}

export function useChangeEmail() {
  return useMutation({
    mutationFn: (input: { newEmail: string; password: string }) =>
      api.post<void>('/auth/email/change', input),
  });
}

export function useRename() {
  return useMutation({
    mutationFn: (input: { name: string }) => api.patch<SessionUser>('/auth/me', input),
    onSuccess: (_answer, { name }) => {
      const { user } = useSession.getState();
      if (user !== null) useSession.setState({ user: { ...user, name } });
    },
  });
}

export function useInvitation(token: string) {
  return useQuery({
    queryKey: ['invitations', token],
    queryFn: ({ signal }) => api.get<InvitationOffer>(`/invitations/${token}`, { ...public_, signal }),
  });
}

export function useAcceptInvitation(token: string) {
  return useMutation({
    mutationFn: (input: { name?: string; password?: string }) =>
      api.post<Session>(`/invitations/${token}/accept`, input, { anonymous: input.password !== undefined }),
    onSuccess: takeSession,
  });
}

export function useStartWorkshop() {
  return useMutation({
    mutationFn: (input: { name: string }) => api.post<Workshop>('/workshops', input),
    onSuccess: ({ id, name, role, isDemo }) =>
      useSession.setState(({ workshops }) => ({ workshops: [...workshops, { id, name, role, isDemo }] })),
  });
}
