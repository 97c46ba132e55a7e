// Drags something in a page to and fro and reads what its scripts took.
const FRAMES = 30;
const STEP_PX = 2;
const FIRST_PX = 8;
const TURN_AT = 10;

/** Milliseconds that scripts of the page have run since it was opened. */
async function scriptMs(client) {
  const { metrics } = await client.send('Performance.getMetrics');
  return 1000 * metrics.find(({ name }) => name === 'ScriptDuration').value;
}

/**
 * Moves the pointer once a frame, out of the page itself: no frame waits for word from outside. Tells whether the page
 * showed after each that something moves, of which nothing is counted yet.
 */
const goOn = (page, points) =>
  page.evaluate(async (points) => {
    let taken = true;
    let moving;
    for (const [clientX, clientY] of points) {
      const held = globalThis.heldAt;
      held.dispatchEvent(
        new PointerEvent('pointermove', {
          pointerId: 1,
          bubbles: true,
          pointerType: 'mouse',
          clientX,
          clientY,
        }),
      );
      await new Promise((done) => requestAnimationFrame(() => setTimeout(done)));
      moving ??= document.querySelector('[aria-busy="true"]');
      taken &&= moving?.ariaBusy === 'true';
    }
    return taken;
  }, points);

/**
 * Takes hold at a point and goes aslant, so that a handle is pulled whichever way it goes. Answers the mean of all frames
 * but the first, and the first alone with the press; the set is left as it was. Undefined where nothing came along.
 */
export async function dragFrom(page, { x, y }) {
  const client = await page.context().newCDPSession(page);
  // Of the thread itself: what others do on the machine meanwhile is no part of it.
  await client.send('Performance.enable', { timeDomain: 'threadTicks' });
  await page.evaluate(
    ([x, y]) => {
      globalThis.heldAt = document.elementFromPoint(x, y);
    },
    [x, y],
  );
  await page.mouse.move(x, y);
  const start = await scriptMs(client);
  await page.mouse.down();
  // First further than a press that shakes.
  const taken = await goOn(page, [[x + FIRST_PX, y + FIRST_PX]]);
  const afterFirst = await scriptMs(client);
  if (!taken) {
    await page.mouse.up();
    await client.detach();
    return undefined;
  }
  const points = Array.from({ length: FRAMES }, (_, n) => {
    const turn = n % (2 * TURN_AT);
    const way = FIRST_PX + STEP_PX * Math.min(turn, 2 * TURN_AT - turn);
    return [x + way, y + way];
  });
  const stillTaken = await goOn(page, points);
  const end = await scriptMs(client);
  if (!stillTaken) throw new Error('What was dragged came to rest on the way.');
  await page.keyboard.press('Escape');
  await page.mouse.up();
  await client.detach();
  return { frame: (end - afterFirst) / FRAMES, first: afterFirst - start };
}
