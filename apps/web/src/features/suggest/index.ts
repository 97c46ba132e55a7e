export { SuggestPage } from './components/suggest-page.tsx';
export { SuggestContext } from './suggest-view.ts';
