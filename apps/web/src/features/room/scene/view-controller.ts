import { between, type ViewFrame, type Viewport } from './view-frame';

const MOVE_MS = 420;
/** The one curve of the app, close to cubic-bezier(0.2, 0.7, 0.2, 1). */
const settle = (t: number): number => 1 - (1 - t) ** 3.2;

export interface ViewController {
  frame: () => ViewFrame | undefined;
  viewport: () => Viewport;
  resize: (viewport: Viewport) => void;
  /** Goes to a frame: in one cut, or in 420 ms where motion is welcome. */
  show: (frame: ViewFrame, move: boolean) => void;
  subscribe: (listener: () => void) => () => void;
  stop: () => void;
}

/** Holds the frame that is on the screen, outside React: pictures and labels follow it together. */
export function createViewController(): ViewController {
  const listeners = new Set<() => void>();
  let viewport: Viewport = { width: 800, height: 500 };
  let current: ViewFrame | undefined;
  let request = 0;
  const tell = () => listeners.forEach((listener) => listener());

  function show(goal: ViewFrame, move: boolean) {
    cancelAnimationFrame(request);
    const start = current;
    if (!start || !move || matchMedia('(prefers-reduced-motion: reduce)').matches) {
      current = goal;
      tell();
      return;
    }
    const began = performance.now();
    const step = (now: number) => {
      const t = Math.min(1, Math.max(0, (now - began) / MOVE_MS));
      current = between(start, goal, settle(t));
      tell();
      if (t < 1) request = requestAnimationFrame(step);
    };
    request = requestAnimationFrame(step);
  }

  return {
    frame: () => current,
    viewport: () => viewport,
    resize: (next) => {
      viewport = next;
    },
    show,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    stop: () => cancelAnimationFrame(request),
  };
}
