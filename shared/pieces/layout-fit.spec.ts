import { describe, expect, it } from 'vitest';
import { smallLayout } from '../layout/small-layout.fixture';
import type { Layout } from '../layout/schema';
import { layoutFit, layoutOutlines, layoutWebs, socketDepth } from './layout-fit';

const layout = smallLayout();

function withJoint(changes: Partial<Layout['joint']>): Layout {
  return { ...layout, joint: { ...layout.joint, ...changes } };
}

it('a layout has a handful of outlines whatever its size', () => {
  const large = { ...layout, shell: { ...layout.shell, staves: 240, courses: 120 } };
  expect(layoutOutlines(large)).toHaveLength(layoutOutlines(layout).length);
  expect(layoutOutlines(withJoint({ scheme: 'one-way' }))).toHaveLength(3);
});

describe('the fit over all outlines', () => {
  it('names the tightest inside radius and the side it is on', () => {
    const tight = withJoint({
      courseJoint: { profile: 'round', headRadius: 3.6, filletRadius: 1.5, reach: 7.2 },
    });
    const fit = layoutFit(tight);
    expect(fit.tightest?.radius).toBeCloseTo(1.56, 12);
    expect(fit.place?.edge).toBe('tab');
    expect(['bottom', 'top']).toContain(fit.place?.side);
  });

  it('takes the smallest largest cutter of all, though another outline has the tighter radius', () => {
    const shapes = withJoint({
      staveJoint: { profile: 'round', headRadius: 3, filletRadius: 3, reach: 9.1 },
      courseJoint: { profile: 'round', headRadius: 4, filletRadius: 2, reach: 7 },
    });
    const fit = layoutFit({ ...shapes, cutter: { diameter: 3, fluteLength: 25 } });
    const alone = layoutOutlines(shapes).map((outline) => layoutFit(shapes, [outline]));
    expect(fit.largestCutter).toBe(Math.min(...alone.map((one) => one.largestCutter)));
    expect(fit.fits).toBe(alone.every((one) => one.fits));
  });
});

describe('webs', () => {
  it('between opposite sockets is the tile less two reaches and the clearance', () => {
    const { betweenSockets } = layoutWebs(layoutOutlines(layout));
    expect(betweenSockets?.distance).toBeCloseTo(28 - 2 * 7.6 - 0.12, 9);
  });

  it('between neighbouring sockets of a one-way tile runs from head to head', () => {
    const { betweenSockets } = layoutWebs(layoutOutlines(withJoint({ scheme: 'one-way' })));
    expect(betweenSockets?.distance).toBeCloseTo(Math.SQRT2 * (14 - 4) - 7.2 - 0.12, 9);
  });

  it('beside a socket is the wood to the shoulder of the next side', () => {
    const { besideSockets } = layoutWebs(layoutOutlines(layout));
    expect(besideSockets?.distance).toBeCloseTo(14 - 0.06 - 3.6 - 0.06, 9);
  });

  it('has none between sockets where a single course leaves only stave joints with tabs', () => {
    const single = { ...layout, shell: { ...layout.shell, courses: 1 } };
    const [withTabs] = layoutOutlines(single);
    expect(withTabs?.edges.left).toBe('tab');
    expect(layoutWebs([withTabs!])).toEqual({ betweenSockets: null, besideSockets: null });
  });
});

it('a socket is as deep as the reach and half the clearance', () => {
  expect(socketDepth(7.6, 0.12)).toBeCloseTo(7.66, 12);
});
