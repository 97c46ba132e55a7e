export { AccountPage as Component } from '@/features/auth/components/account-page.tsx';
