import { startingLayout } from '@shared/layout/starting-layout';
import { describe, expect, it } from 'vitest';
import { projectShell } from './projected-shell';
import { pictureOf } from './shell-picture';

const layout = startingLayout('Test');

describe('the shell as a flat drawing', () => {
  it('draws the tiles that face the viewer and one piece of rim a stave', () => {
    const { tiles, rim } = projectShell(pictureOf(layout), 0);
    const { staves, courses } = layout.shell;
    expect(rim).toHaveLength(staves);
    expect(tiles.length).toBeGreaterThanOrEqual((staves / 2) * courses);
    expect(tiles.length).toBeLessThan((staves / 2 + 4) * courses);
  });

  it('keeps every tile within the width of the turned outside', () => {
    const { tiles } = projectShell(pictureOf(layout), 1.3);
    const radius = layout.shell.finishedOuterDiameter / 2;
    for (const { d } of tiles) {
      for (const [, x] of d.matchAll(/[ML](-?[\d.]+) /g)) {
        expect(Math.abs(Number(x))).toBeLessThanOrEqual(radius + 0.01);
      }
    }
  });

  it('is the same after a whole turn', () => {
    const once = projectShell(pictureOf(layout), 0.4);
    const again = projectShell(pictureOf(layout), 0.4 + 2 * Math.PI);
    expect(again.rim.map(({ d }) => d)).toEqual(once.rim.map(({ d }) => d));
  });
});
