export * from './parts/part.ts';
export * from './room/document.ts';
