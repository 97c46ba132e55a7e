export type { RowOrder } from './columns.ts';
export { FitFoot } from './components/fit-foot.tsx';
export { FitCaution, FitKey } from './components/fit-key.tsx';
export { FitGrid } from './components/fit-grid.tsx';
export { FitPeople } from './components/fit-people.tsx';
export { PiecesAndWays } from './components/pieces-and-ways.tsx';
export { FitViewContext, type FitView } from './fit-view.ts';
