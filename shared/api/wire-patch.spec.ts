import { describe, expect, it } from 'vitest';
import type { Patch } from '../layout/patch';
import { patchSchema } from './layout';
import { patchOfWire, wirePatchOf } from './wire-patch';

const patch: Patch = [
  { kind: 'cells', positions: [0, 5], before: [0, 1], after: [1, 0] },
  { kind: 'field', path: 'joint.clearance', before: 0.12, after: 0.15 },
  {
    kind: 'resize',
    before: { staves: 6, courses: 1, cells: Uint8Array.from([1, 0, 0, 0, 0, 1]) },
    after: { staves: 7, courses: 1, cells: Uint8Array.from([1, 0, 0, 0, 0, 1, 0]) },
  },
];

describe('a patch on its way between browser and server', () => {
  it('comes out as it went in, through JSON and the schema', () => {
    const arrived = patchSchema.parse(JSON.parse(JSON.stringify(wirePatchOf(patch))));
    expect(patchOfWire(arrived)).toEqual(patch);
  });

  it('is refused when the cells of a resize are not base64', () => {
    const wire = wirePatchOf(patch);
    const resize = wire[2];
    if (resize?.kind === 'resize') resize.after.cells = '*not base64*';
    expect(patchOfWire(wire)).toBeNull();
  });
});
