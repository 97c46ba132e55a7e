/** Times of some runs, milliseconds, rising. */
export function timesOf(runs, task) {
  const times = [];
  for (let n = 0; n < runs; n += 1) {
    const start = performance.now();
    task(n);
    times.push(performance.now() - start);
  }
  return times.sort((a, b) => a - b);
}

export const middleTime = (runs, task) => timesOf(runs, task)[Math.floor(runs / 2)];

/** For a figure that sets two times against each other: what else the machine does lengthens the others. */
export const leastTime = (runs, task) => timesOf(runs, task)[0];
