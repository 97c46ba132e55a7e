export { Entrance as Component } from '@/features/auth/components/entrance.tsx';
