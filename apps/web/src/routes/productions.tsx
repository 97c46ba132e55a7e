export { ProductionsPage as Component } from '@/features/productions/components/productions-page.tsx';
