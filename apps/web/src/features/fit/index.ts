export { FitFoot } from './components/fit-foot.tsx';
export { FitPage } from './components/fit-page.tsx';
export { FitViewContext, type FitView } from './fit-view.ts';
