import { describe, expect, it } from 'vitest';
import { FRONT_FRAME } from '../test/front-frame.ts';
import { followView } from './follow-view.ts';
import { createViewController } from './view-controller.ts';

function follow() {
  const done: string[] = [];
  const size = { width: 800, height: 500, top: 0, left: 0 };
  const controller = createViewController();
  const stop = followView(controller, () => ({
    size,
    setSize: (width, height) => {
      Object.assign(size, { width, height });
      done.push(`${width} by ${height}`);
    },
    advance: () => done.push('drawn'),
    invalidate: () => done.push('asked for'),
  }));
  return { controller, done, stop };
}

describe('the picture that follows the view', () => {
  it('is made anew and drawn at once on a sheet of another size', () => {
    const { controller, done } = follow();
    controller.resize({ width: 800, height: 320 });
    controller.show(FRONT_FRAME, false);
    expect(done).toEqual(['800 by 320', 'drawn']);
  });

  it('waits for the next frame where only the view moved, and stops when told', () => {
    const { controller, done, stop } = follow();
    controller.resize({ width: 800, height: 500 });
    controller.show(FRONT_FRAME, false);
    expect(done).toEqual(['asked for']);
    stop();
    controller.show(FRONT_FRAME, false);
    expect(done).toHaveLength(1);
  });
});
