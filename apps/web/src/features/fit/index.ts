export { FitFoot } from './components/fit-foot.tsx';
export { FitPage } from './components/fit-page.tsx';
export { FitViewContext } from './fit-view.ts';
export { SeatHeightBand } from './components/seat-height-band.tsx';
