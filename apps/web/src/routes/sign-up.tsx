export { SignUpPage as Component } from '@/features/auth/components/sign-up-page.tsx';
