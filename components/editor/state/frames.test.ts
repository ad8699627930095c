import { describe, expect, it } from 'vitest';
import { frameLoop } from './frames';

function handFrames() {
  const queue: (() => void)[] = [];
  return {
    loop: frameLoop(
      (act) => queue.push(act),
      () => queue.splice(0),
    ),
    waiting: () => queue.length,
    next: () => queue.shift()?.(),
  };
}

describe('frameLoop', () => {
  it('takes only the newest input and paints once for any number of requests', () => {
    const frames = handFrames();
    const log: string[] = [];
    frames.loop.add(() => log.push('paint'));
    frames.next();
    for (const move of ['a', 'b', 'c']) frames.loop.input(() => log.push(move));
    frames.loop.request();
    expect(frames.waiting()).toBe(1);
    frames.next();
    expect(log).toEqual(['paint', 'c', 'paint']);
  });

  it('paints what an input changed in the same frame, and needs no second one', () => {
    const frames = handFrames();
    let value = 1;
    let painted = 0;
    frames.loop.add(() => {
      painted = value;
    });
    frames.next();
    frames.loop.input(() => {
      value = 7;
      frames.loop.request();
    });
    frames.next();
    expect(painted).toBe(7);
    expect(frames.waiting()).toBe(0);
  });
});
