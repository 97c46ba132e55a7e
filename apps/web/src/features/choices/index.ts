export { ChoicesContext } from './choices-view.ts';
export { StickPage } from './components/stick-page.tsx';
