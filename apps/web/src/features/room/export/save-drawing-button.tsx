import { lazy, Suspense, useState } from 'react';
import { Button } from '@/components/button.tsx';

const SaveDrawing = lazy(() => import('./save-drawing.tsx'));

/** Opens the dialog that saves drawings; it is fetched when it is first asked for. */
export function SaveDrawingButton() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button look="word" onClick={() => setOpen(true)}>
        Save a drawing…
      </Button>
      {open && (
        <Suspense fallback={null}>
          <SaveDrawing onClose={() => setOpen(false)} />
        </Suspense>
      )}
    </>
  );
}
