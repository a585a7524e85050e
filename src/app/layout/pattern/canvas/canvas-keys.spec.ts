import { describe, expect, it } from 'vitest';
import { canvasKey } from './canvas-keys';

const plain = { shiftKey: false, ctrlKey: false, metaKey: false, altKey: false };

describe('keys on the canvas', () => {
  it('walk the tiles with the arrows, up towards the higher course', () => {
    expect(canvasKey({ ...plain, key: 'ArrowUp' })).toEqual({
      kind: 'walk',
      staves: 0,
      courses: 1,
    });
    expect(canvasKey({ ...plain, key: 'ArrowLeft' })).toEqual({
      kind: 'walk',
      staves: -1,
      courses: 0,
    });
  });

  it('move the window with Shift', () => {
    expect(canvasKey({ ...plain, shiftKey: true, key: 'ArrowDown' })).toEqual({
      kind: 'pan',
      x: 0,
      y: 1,
    });
  });

  it("leave the browser's own alone", () => {
    expect(canvasKey({ ...plain, ctrlKey: true, key: '+' })).toBeNull();
    expect(canvasKey({ ...plain, key: 'Tab' })).toBeNull();
  });
});
