export { RevisionsPage } from './components/revisions-page.tsx';
export { RoomPage, type RoomSlots } from './components/room-page.tsx';
export { SpecLine } from './components/spec-line.tsx';
export { useRoomForFit, type RoomForFit } from './room-for-fit.ts';
export type { SetPath } from './api.ts';
export { SetSheet } from './components/set-sheet.tsx';
