export { ResetPasswordPage as Component } from '@/features/auth/components/reset-password-page.tsx';
