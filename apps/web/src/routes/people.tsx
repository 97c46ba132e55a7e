export { PeoplePage as Component } from '@/features/cast/components/people-page.tsx';
