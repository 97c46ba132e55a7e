import type { ReactNode } from 'react';
import { useIsMoving } from '../store.ts';

/** Numbers that are counted when the hand rests: dimmed while something moves, as they are still those of before. */
export function Counted({ children }: { children: ReactNode }) {
  const isMoving = useIsMoving();
  return (
    <div aria-busy={isMoving} className={isMoving ? 'contents *:opacity-50' : 'contents'}>
      {children}
    </div>
  );
}
