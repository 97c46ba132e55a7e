/** A hand that has been still for so long rests. */
export const REST_MS = 150;
/** Frames that have to be drawn meanwhile: where drawing is slow, the hand's next way is told late. */
const REST_FRAMES = 2;

/** Calls `then` once a movement has come to rest: `go` says that it goes on, `stop` that it is over. */
export function createRest(then: () => void): { go: () => void; stop: () => void } {
  let timer: ReturnType<typeof setTimeout> | undefined;
  let frame = 0;
  function stop() {
    clearTimeout(timer);
    cancelAnimationFrame(frame);
  }
  function after(frames: number) {
    if (frames === 0) timer = setTimeout(then);
    else frame = requestAnimationFrame(() => after(frames - 1));
  }
  return {
    go: () => {
      stop();
      timer = setTimeout(() => after(REST_FRAMES), REST_MS);
    },
    stop,
  };
}
