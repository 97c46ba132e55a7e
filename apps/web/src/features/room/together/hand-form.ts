import { create } from 'zustand';

export type HandFormKind = 'mirror' | 'row';

/** The form that is open for chosen pieces, and for which. */
interface Open {
  kind: HandFormKind;
  pieceIds: readonly string[];
}

export const useHandForm = create<{ open: Open | undefined }>(() => ({ open: undefined }));

export const openHandForm = (kind: HandFormKind, pieceIds: readonly string[]): void =>
  useHandForm.setState({ open: { kind, pieceIds } });

export const closeHandForm = (): void => useHandForm.setState({ open: undefined });
