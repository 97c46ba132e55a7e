import { useEffect } from 'react';
import { announce } from '@/lib/announce.ts';
import { Toggle } from '../components/toggle.tsx';
import { isTaken, useSingleKeys } from '../hooks/use-shortcuts.ts';
import type { SeatedBody } from '../picture.ts';
import { useChosenPlace } from '../posture/chosen-place.ts';
import { doubted, sayDoubt, useDoubt } from './doubt.ts';

/** Shows or hides the outlines, and says so. */
function show(shown: boolean, bodies: readonly SeatedBody[]): void {
  useDoubt.setState({ shown });
  const { placeId } = useChosenPlace.getState();
  announce(shown ? sayDoubt(doubted(bodies, placeId)) : 'Doubt hidden.');
}

interface Props {
  bodies: readonly SeatedBody[];
  children: string;
}

/** The switch for how small and how large people may be. */
export function DoubtToggle({ bodies, children }: Props) {
  const on = useDoubt((state) => state.shown);
  return (
    <Toggle on={on} onChange={(shown) => show(shown, bodies)}>
      {children}
    </Toggle>
  );
}

/** U, for unsure, does the same. */
export function useDoubtKey(bodies: readonly SeatedBody[]): void {
  const singleKeys = useSingleKeys((state) => state.on);
  useEffect(() => {
    if (!singleKeys || bodies.length === 0) return undefined;
    const listen = (event: KeyboardEvent) => {
      if (isTaken(event) || event.altKey || event.ctrlKey || event.metaKey) return;
      if (event.key.toLowerCase() !== 'u') return;
      show(!useDoubt.getState().shown, bodies);
      event.preventDefault();
    };
    window.addEventListener('keydown', listen);
    return () => window.removeEventListener('keydown', listen);
  }, [bodies, singleKeys]);
}
