import { describe, expect, it } from 'vitest';
import { boardKey, type KeyPress, keyStep, toStep } from './keySteps';

const press = (key: string, held: Partial<KeyPress> = {}): KeyPress => ({
  key,
  shiftKey: false,
  altKey: false,
  ctrlKey: false,
  metaKey: false,
  ...held,
});
const handle = { value: 310, min: 60, max: 2000, step: 5 };

describe('keyStep', () => {
  it.each([
    ['ArrowRight', {}, 315],
    ['ArrowUp', {}, 315],
    ['ArrowLeft', {}, 305],
    ['ArrowDown', { shiftKey: true }, 260],
    ['ArrowRight', { shiftKey: true }, 360],
    ['ArrowRight', { altKey: true }, 310.5],
    ['ArrowLeft', { altKey: true }, 309.5],
    ['PageUp', {}, 360],
    ['Home', {}, 60],
    ['End', {}, 2000],
    ['Tab', {}, null],
    ['ArrowRight', { ctrlKey: true }, null],
  ] as const)('%s with %o asks for %s', (key, held, value) => {
    expect(keyStep(press(key, held), handle)).toBe(value);
  });

  it('grows no tail of nines over many fine steps', () => {
    let value = 0.3;
    for (let time = 0; time < 7; time += 1)
      value = keyStep(press('ArrowRight', { altKey: true }), { ...handle, value, step: 1 }) ?? Number.NaN;
    expect(value).toBe(1);
  });
});

describe('toStep', () => {
  it('rounds to steps, and to tenths of one when fine', () => {
    expect(toStep(312.6, 5, false)).toBe(315);
    expect(toStep(312.6, 5, true)).toBe(312.5);
    expect(toStep(0.4249, 0.01, false)).toBe(0.42);
  });
  it('refuses a step of nothing', () => {
    expect(() => toStep(3, 0, false)).toThrow(RangeError);
  });
});

describe('boardKey', () => {
  it.each([
    ['z', { ctrlKey: true }, 'undo'],
    ['Z', { metaKey: true, shiftKey: true }, 'redo'],
    ['y', { ctrlKey: true }, 'redo'],
    ['?', { shiftKey: true }, 'help'],
    ['z', {}, null],
    ['ArrowLeft', {}, null],
  ] as const)('%s with %o is %s', (key, held, act) => {
    expect(boardKey(press(key, held))).toBe(act);
  });
});
