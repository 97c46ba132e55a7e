export { ConfirmPage as Component } from '@/features/auth/components/confirm-page.tsx';
