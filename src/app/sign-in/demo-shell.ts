import { startingLayout } from '@shared/layout/starting-layout';
import type { Layout } from '@shared/layout/schema';

const ASH = 0;
const WALNUT = 1;
const SAPELE = 2;

/** The lantern that turns beside the sign-in form: diamonds of walnut in ash, each with a red heart. */
export function demoShell(): Layout {
  const start = startingLayout('Ferry-hall lantern');
  const shell = {
    ...start.shell,
    staves: 32,
    courses: 9,
    tileWidth: 28,
    tileHeight: 28,
    finishedOuterDiameter: 280,
    finishedInnerDiameter: 262,
    finishedHeight: 238,
  };
  const joint = { profile: 'round', headRadius: 3.6, filletRadius: 1.8, reach: 7.6 } as const;
  const cells = Uint8Array.from({ length: shell.staves * shell.courses }, (_, position) =>
    woodAt(position % shell.staves, Math.floor(position / shell.staves)),
  );
  return {
    ...start,
    shell,
    joint: { ...start.joint, staveJoint: joint, courseJoint: joint },
    woods: [
      { key: 'ash', name: 'White ash', colour: '#DCC39A', sawn: 'flat' },
      { key: 'walnut', name: 'Black walnut', colour: '#5B3D2A', sawn: 'flat' },
      { key: 'sapele', name: 'Sapele', colour: '#A04E33', sawn: 'flat' },
    ],
    cells,
  };
}

function woodAt(stave: number, course: number): number {
  const across = Math.abs(((stave + 4) % 8) - 4);
  const up = Math.abs(course - 4);
  if (across + up === 4) return WALNUT;
  return across + up === 0 ? SAPELE : ASH;
}
