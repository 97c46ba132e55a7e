import { useEffect } from 'react';

/** Parts of the room that come after it; all of them, so that an open page keeps working without a line. */
const PARTS = [
  () => import('../components/conflict-screen.tsx'),
  () => import('../components/keys-dialog.tsx'),
  () => import('../components/numbers-dialog.tsx'),
  () => import('../cushions-make/make-dialog.tsx'),
  () => import('../export/save-drawing.tsx'),
  () => import('../handles/handle-layer.tsx'),
  () => import('../posture/sitting.tsx'),
  () => import('../tape-tool/measures.tsx'),
  () => import('../together/hand-form-panel.tsx'),
  () => import('../views/lens-form.tsx'),
  () => import('../ways/ways.tsx'),
];

const WAIT_MS = 4000;

/** Fetches them one after another once the room has had time to stand; a failure shows when the part is wanted. */
export function useFetchedParts(): void {
  useEffect(() => {
    let left = false;
    const fetchParts = async () => {
      for (const part of PARTS) {
        if (left) return;
        await part().catch(() => undefined);
      }
    };
    const timer = setTimeout(() => void fetchParts(), WAIT_MS);
    return () => {
      left = true;
      clearTimeout(timer);
    };
  }, []);
}
