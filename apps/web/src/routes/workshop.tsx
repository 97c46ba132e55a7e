export { WorkshopPage as Component } from '@/features/workshop/components/workshop-page.tsx';
