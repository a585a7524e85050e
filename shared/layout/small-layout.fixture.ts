import type { Layout } from './schema';

/** A layout of 8 staves and 3 courses in four woods, every tile of the first. */
export function smallLayout(): Layout {
  return {
    name: 'Small ring',
    lengthUnit: 'mm',
    shell: {
      staves: 8,
      courses: 3,
      tileWidth: 28,
      tileHeight: 28,
      finishedOuterDiameter: 60,
      finishedInnerDiameter: 40,
      finishedHeight: 70,
      boardThickness: 20,
      skimAllowance: 0.5,
    },
    joint: {
      scheme: 'alternating',
      clearance: 0.12,
      staveJoint: { profile: 'round', headRadius: 3.6, filletRadius: 1.8, reach: 7.6 },
      courseJoint: { profile: 'round', headRadius: 3.6, filletRadius: 1.8, reach: 7.6 },
    },
    cutter: { diameter: 3.175, fluteLength: 25 },
    build: { way: 'stave-by-stave', turnOver: true, spareShare: 0.1, spareMinimum: 1 },
    woods: [
      { key: 'ash', name: 'White ash', colour: '#DCC39A', sawn: 'flat' },
      { key: 'walnut', name: 'Black walnut', colour: '#5B3D2A', sawn: 'flat' },
      { key: 'sapele', name: 'Sapele', colour: '#964B33', sawn: 'quarter' },
      { key: 'beech', name: 'Beech', colour: '#D9AC80', sawn: 'flat' },
    ],
    cells: new Uint8Array(24),
  };
}
