import type { RootState } from '@react-three/fiber';
import type { ViewController } from './view-controller';

type Picture = Pick<RootState, 'size' | 'setSize' | 'advance' | 'invalidate'>;

/**
 * Redraws with the view. On a sheet of another size the picture is made and drawn at once, so that
 * none of the former size is painted; whatever else moves is drawn in the next frame.
 */
export function followView(controller: ViewController, get: () => Picture): () => void {
  return controller.subscribe(() => {
    const { size, setSize, advance, invalidate } = get();
    const { width, height } = controller.viewport();
    if (size.width === width && size.height === height) {
      invalidate();
      return;
    }
    setSize(width, height);
    advance(performance.now());
  });
}
