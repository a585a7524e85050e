import type { Layout } from './schema';

const WOODS: Layout['woods'] = [
  {
    key: 'maple',
    name: 'Hard maple',
    colour: '#E3CFA6',
    species: 'Acer saccharum',
    sawn: 'flat',
  },
  {
    key: 'walnut',
    name: 'Black walnut',
    colour: '#5A3D2B',
    species: 'Juglans nigra',
    sawn: 'flat',
  },
];

/** What a new commission starts from: a small shell that can be cut as it stands, all in one wood. */
export function startingLayout(name: string): Layout {
  const shell: Layout['shell'] = {
    staves: 24,
    courses: 8,
    tileWidth: 30,
    tileHeight: 30,
    finishedOuterDiameter: 224,
    finishedInnerDiameter: 206,
    finishedHeight: 228,
    boardThickness: 15,
    skimAllowance: 0.5,
  };
  return {
    name,
    lengthUnit: 'mm',
    shell,
    joint: {
      scheme: 'alternating',
      clearance: 0.12,
      staveJoint: { profile: 'round', headRadius: 4, filletRadius: 2, reach: 8.4 },
      courseJoint: { profile: 'round', headRadius: 4, filletRadius: 2, reach: 8.4 },
    },
    cutter: { diameter: 3.175, fluteLength: 16 },
    build: { way: 'stave-by-stave', turnOver: true, spareShare: 0.1, spareMinimum: 1 },
    woods: WOODS,
    cells: new Uint8Array(shell.staves * shell.courses),
  };
}
