/** What the fields of a layout owe each other, beyond what the schema says of each. */
import { closeProfile } from '../joint/edge-profile';
import { refusalSentence } from '../joint/refusal';
import { formatLength } from '../units/format';
import type { Layout, Problem } from './schema';

/** Everything that keeps a layout from being built up, field by field; empty when it can be. */
export function problemsOf(layout: Layout): Problem[] {
  return [
    ...cellProblems(layout),
    ...woodProblems(layout),
    ...ringProblems(layout),
    ...jointProblems(layout),
  ];
}

function cellProblems({ shell, cells, woods }: Layout): Problem[] {
  const expected = shell.staves * shell.courses;
  if (cells.length !== expected) {
    const size = `${shell.staves} staves × ${shell.courses} courses need ${expected} bytes`;
    return [{ field: 'cells', message: `must hold one byte a tile: ${size}, not ${cells.length}` }];
  }
  const stray = cells.findIndex((wood) => wood >= woods.length);
  if (stray === -1) return [];
  const known = woods.length === 1 ? 'only wood 0' : `woods 0 to ${woods.length - 1}`;
  const message = `names wood ${cells[stray]} at byte ${stray}, but there ${woods.length === 1 ? 'is' : 'are'} ${known}`;
  return [{ field: 'cells', message }];
}

function woodProblems({ woods }: Layout): Problem[] {
  return woods.flatMap((wood, i) => {
    const first = woods.findIndex((other) => other.key === wood.key);
    if (first === i) return [];
    return [
      {
        field: `woods.${i}.key`,
        message: `must not repeat the key "${wood.key}" of wood ${first}`,
      },
    ];
  });
}

function ringProblems({ shell, joint, lengthUnit }: Layout): Problem[] {
  if (shell.finishedInnerDiameter >= shell.finishedOuterDiameter) {
    const outer = formatLength(shell.finishedOuterDiameter, lengthUnit);
    return [
      {
        field: 'shell.finishedInnerDiameter',
        message: `must be under the outer diameter, ${outer}`,
      },
    ];
  }
  // the tab term of the board thickness needs a bore wider than the tab stands out
  const least = 2 * (joint.staveJoint.reach + shell.skimAllowance);
  if (shell.finishedInnerDiameter > least) return [];
  const bound = formatLength(least, lengthUnit);
  return [
    {
      field: 'shell.finishedInnerDiameter',
      message: `must be over ${bound}: twice the stave joint's reach and the skim allowance`,
    },
  ];
}

function jointProblems({ shell, joint, lengthUnit }: Layout): Problem[] {
  const edges = [
    { field: 'joint.staveJoint', parameters: joint.staveJoint, edgeLength: shell.tileHeight },
    { field: 'joint.courseJoint', parameters: joint.courseJoint, edgeLength: shell.tileWidth },
  ];
  return edges.flatMap(({ field, parameters, edgeLength }) => {
    const closed = closeProfile(parameters, edgeLength, joint.clearance);
    if (closed.ok) return [];
    return closed.refusals.map((refusal) => ({
      field: `${field}.${refusal.field}`,
      message: refusalSentence(refusal, lengthUnit),
    }));
  });
}
