export { ResetPage as Component } from '@/features/auth/components/reset-page.tsx';
