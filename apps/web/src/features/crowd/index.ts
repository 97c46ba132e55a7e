export { CrowdPage } from './components/crowd-page.tsx';
export { CrowdContext } from './crowd-view.ts';
