import {
  applyPatch,
  invertPatch,
  overlapOf,
  type CellsChange,
  type FieldChange,
  type Patch,
} from '@shared/layout/patch';
import type { Layout } from '@shared/layout/schema';
import { startingLayout } from '@shared/layout/starting-layout';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ruleOnEdit, type EditRuling } from './edit-rules';

const start = startingLayout('Bench');

const cellsChange: fc.Arbitrary<CellsChange> = fc
  .uniqueArray(fc.tuple(fc.nat(191), fc.nat(1), fc.nat(1)), {
    selector: ([position]) => position,
    minLength: 1,
    maxLength: 12,
  })
  .map((tiles) => ({
    kind: 'cells',
    positions: tiles.map(([position]) => position),
    before: tiles.map(([, before]) => before),
    after: tiles.map(([, , after]) => after),
  }));

const clearanceChange: fc.Arbitrary<FieldChange> = fc
  .integer({ min: 5, max: 30 })
  .map((hundredths) => ({
    kind: 'field',
    path: 'joint.clearance',
    before: 0,
    after: hundredths / 100,
  }));

const patches: fc.Arbitrary<Patch> = fc.array(fc.oneof(cellsChange, clearanceChange), {
  minLength: 1,
  maxLength: 4,
});

function accepted(draft: Layout, patch: Patch, others: Patch = []) {
  const ruling: EditRuling = ruleOnEdit({ draft, patch, others, roles: ['owner'] });
  if (ruling.kind !== 'accepted') throw new Error(ruling.kind);
  return ruling;
}

describe('the ruling on an edit', () => {
  it('records a patch that leads there, and inverted leads back, whatever "before" was claimed', () => {
    fc.assert(
      fc.property(patches, (patch) => {
        const { layout, patch: recorded } = accepted(start, patch);
        expect(layout).toEqual(applyPatch(start, patch));
        expect(applyPatch(start, recorded)).toEqual(layout);
        expect(applyPatch(layout, invertPatch(recorded))).toEqual(start);
      }),
    );
  });

  it('of two edits made on the same revision is the same draft in either order, or a conflict', () => {
    fc.assert(
      fc.property(patches, patches, (mine, theirs) => {
        const afterTheirs = accepted(start, theirs);
        const proposed = { draft: afterTheirs.layout, patch: mine, others: afterTheirs.patch };
        const ruling = ruleOnEdit({ ...proposed, roles: ['owner'] });
        if (overlapOf(mine, theirs)) {
          expect(ruling.kind).toBe('conflict');
        } else {
          const afterMine = accepted(start, mine);
          const other = accepted(afterMine.layout, theirs, afterMine.patch);
          expect(ruling).toMatchObject({ kind: 'accepted', layout: other.layout });
        }
      }),
    );
  });

  it('refuses a client whatever is changed', () => {
    const patch: Patch = [{ kind: 'cells', positions: [0], before: [0], after: [1] }];
    expect(ruleOnEdit({ draft: start, patch, others: [], roles: ['client'] }).kind).toBe(
      'not-allowed',
    );
  });
});
