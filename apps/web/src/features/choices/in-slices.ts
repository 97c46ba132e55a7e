const SLICE_MS = 16;
const TELL_MS = 150;
const breath = () => new Promise<void>((resolve) => setTimeout(resolve));

/**
 * Runs steps so that the page stays free: some milliseconds at a time.
 *
 * @param onSlice - told now and then what the last step yielded
 * @returns what the steps return; `undefined` when it was stopped
 */
export async function inSlices<Step, Result>(
  steps: Generator<Step, Result, void>,
  stopped: AbortSignal,
  onSlice?: (step: Step) => void,
): Promise<Result | undefined> {
  let began = performance.now();
  let told = began;
  for (;;) {
    if (stopped.aborted) return undefined;
    const step = steps.next();
    if (step.done) return step.value;
    if (performance.now() - began < SLICE_MS) continue;
    if (performance.now() - told > TELL_MS) {
      onSlice?.(step.value);
      told = performance.now();
    }
    await breath();
    began = performance.now();
  }
}
