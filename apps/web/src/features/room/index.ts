export { ComparePage } from './compare/compare-page.tsx';
export { RevisionsPage } from './components/revisions-page.tsx';
export { RoomPage } from './components/room-page.tsx';
export { SpecLine } from './components/spec-line.tsx';
export { useRoomForChoices } from './room-for-choices.ts';
export { useRoomForFit } from './room-for-fit.ts';
export { useRoomForSuggest } from './room-for-suggest.ts';
export { SetSheet } from './components/set-sheet.tsx';
