export { InvitationPage as Component } from '@/features/auth/components/invitation-page.tsx';
