import { formatLength, formatShare } from '@shared/units/format';
import type { LengthUnit } from '@shared/units/length';

/** What the fields of a layout are called on the screen, by their place in the layout file. */
const NAMES: Readonly<Record<string, string>> = {
  name: 'Name',
  lengthUnit: 'Unit of length',
  'shell.staves': 'Staves round',
  'shell.courses': 'Courses high',
  'shell.tileWidth': 'Tile width',
  'shell.tileHeight': 'Tile height',
  'shell.finishedOuterDiameter': 'Turned outside to',
  'shell.finishedInnerDiameter': 'Bored to',
  'shell.finishedHeight': 'Finished height',
  'shell.boardThickness': 'Board',
  'shell.skimAllowance': 'To turn away',
  'joint.scheme': 'Tabs',
  'joint.clearance': 'Clearance between mating edges',
  'joint.staveJoint': 'Stave joint',
  'joint.courseJoint': 'Course joint',
  'cutter.diameter': 'Cutter diameter',
  'cutter.fluteLength': 'Flute length',
  'build.way': 'Way of building',
  'build.turnOver': 'Turning pieces over',
  'build.spareShare': 'Share of spares',
  'build.spareMinimum': 'Least spares of a kind',
  woods: 'Woods',
  cells: 'Pattern',
  file: 'The file',
  format: 'Format',
  formatVersion: 'Format version',
};

const JOINT_NAMES: Readonly<Record<string, string>> = {
  profile: 'profile',
  headRadius: 'head radius',
  filletRadius: 'neck fillet radius',
  reach: 'tab reach',
  rootWidth: 'root width',
  flankAngle: 'flank angle',
  tipRadius: 'tip radius',
  rootRadius: 'root fillet radius',
};

/** The name of a field; a field nobody named is shown by its place in the file. */
export function fieldName(field: string): string {
  const joint = /^(joint\.(?:stave|course)Joint)\.(\w+)$/.exec(field);
  const parameter = joint?.[2] && JOINT_NAMES[joint[2]];
  if (joint?.[1] && parameter) return `${NAMES[joint[1]] ?? joint[1]}, ${parameter}`;
  return NAMES[field] ?? field;
}

/** A field's value in words, for telling two values apart. */
export function fieldValue(field: string, value: unknown, unit: LengthUnit): string {
  if (field === 'build.spareShare' && typeof value === 'number') return formatShare(value);
  if (field === 'build.spareMinimum') return String(value);
  if (typeof value === 'number') return formatLength(value, unit);
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'string') return WORDS[value] ?? value;
  if (Array.isArray(value)) return value.map(woodName).join(', ');
  if (typeof value === 'object' && value !== null) return jointValue(value, unit);
  return '';
}

const WORDS: Readonly<Record<string, string>> = {
  mm: 'millimetres',
  in: 'inches',
  alternating: 'tabs alternate',
  'one-way': 'tabs one way',
  'stave-by-stave': 'stave by stave',
  'tile-by-tile': 'tile by tile',
};

function woodName(wood: unknown): string {
  return typeof wood === 'object' && wood !== null && 'name' in wood ? String(wood.name) : '';
}

function jointValue(parameters: object, unit: LengthUnit): string {
  return Object.entries(parameters)
    .map(([name, value]: [string, unknown]) => {
      if (name === 'profile') return String(value);
      const figure =
        name === 'flankAngle' ? `${String(value)}°` : formatLength(Number(value), unit);
      return `${JOINT_NAMES[name] ?? name} ${figure}`;
    })
    .join(', ');
}
