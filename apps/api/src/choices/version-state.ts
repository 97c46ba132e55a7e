import type { Version } from './versions.service';

/** Which version an answer is about. */
export const versionState = ({ state }: Version): { draftNumber?: number; revisionLetter?: string } =>
  state.kind === 'draft' ? { draftNumber: state.number } : { revisionLetter: state.letter };
