/** What changed between two layouts, in the reader's words and unit. */
import { formatCutter } from '@shared/checks/context';
import type { Comparison } from '@shared/layout/comparison';
import type { FieldChange, FieldPath } from '@shared/layout/patch';
import type { Joint, Layout, Wood } from '@shared/layout/schema';
import { formatAngle, formatLength } from '@shared/units/format';
import { fromMillimetres, type LengthUnit, type Millimetres } from '@shared/units/length';

/** One thing that reads otherwise than before. */
export interface ChangedFigure {
  readonly subject: string;
  readonly before: string;
  readonly after: string;
  readonly kind: 'text' | 'colour';
}

export interface ComparisonWords {
  /** The whole in one line: "12 tiles, 2 figures and 1 wood"; "nothing" when both are the same. */
  readonly summary: string;
  readonly figures: readonly ChangedFigure[];
  /** Sentences about woods that came or went. */
  readonly woods: readonly string[];
  /** Sentences about tiles, most first. */
  readonly tiles: readonly string[];
}

type Parameters = Joint['staveJoint'];

const SUBJECTS: Readonly<Record<Exclude<FieldPath, 'woods'>, string>> = {
  name: 'Name',
  lengthUnit: 'Unit',
  'shell.tileWidth': 'Tile width',
  'shell.tileHeight': 'Tile height',
  'shell.finishedOuterDiameter': 'Turned outside to',
  'shell.finishedInnerDiameter': 'Bored to',
  'shell.finishedHeight': 'Finished height',
  'shell.boardThickness': 'Board thickness',
  'shell.skimAllowance': 'To turn away',
  'joint.scheme': 'Scheme',
  'joint.clearance': 'Clearance',
  'joint.staveJoint': 'Stave joint',
  'joint.courseJoint': 'Course joint',
  'cutter.diameter': 'Cutter',
  'cutter.fluteLength': 'Flute length',
  'build.way': 'Way of building',
  'build.turnOver': 'Every other tile face down',
  'build.spareShare': 'Spares',
  'build.spareMinimum': 'Spares, least a kind',
};

const PARAMETER_NAMES: Readonly<Record<string, string>> = {
  headRadius: 'head radius',
  filletRadius: 'fillet radius',
  reach: 'reach',
  rootWidth: 'root width',
  flankAngle: 'flank angle',
  tipRadius: 'tip radius',
  rootRadius: 'root radius',
};

/** The comparison of two layouts in words. */
export function comparisonWords(
  comparison: Comparison,
  before: Layout,
  after: Layout,
  unit: LengthUnit,
): ComparisonWords {
  const resize = resizeFigures(comparison);
  const figures = [
    ...resize,
    ...comparison.fields.flatMap((change) => figuresOf(change, unit)),
    ...changedWoods(before.woods, after.woods),
  ];
  const woods = woodsComeAndGone(before.woods, after.woods);
  const parts = [
    counted(comparison.tiles.length, 'tile'),
    counted(figures.length, 'figure'),
    counted(woods.length, 'wood'),
  ].filter((part) => part !== '');
  return {
    summary: parts.length === 0 ? 'nothing' : listed(parts),
    figures,
    woods,
    tiles: tileSentences(comparison.tiles, before, after),
  };
}

/** "1 tile", "12 tiles", and nothing for none. */
function counted(count: number, noun: string): string {
  return count === 0 ? '' : `${count} ${noun}${count === 1 ? '' : 's'}`;
}

function listed(parts: readonly string[]): string {
  if (parts.length <= 1) return parts.join('');
  return `${parts.slice(0, -1).join(', ')} and ${parts.at(-1) ?? ''}`;
}

function resizeFigures({ resize }: Comparison): ChangedFigure[] {
  if (!resize) return [];
  const { before, after } = resize;
  return [
    text('Staves', `${before.staves}`, `${after.staves}`),
    text('Courses', `${before.courses}`, `${after.courses}`),
  ].filter((figure) => figure.before !== figure.after);
}

function figuresOf(change: FieldChange, unit: LengthUnit): ChangedFigure[] {
  switch (change.path) {
    case 'woods':
      return [];
    case 'joint.staveJoint':
    case 'joint.courseJoint':
      return jointFigures(SUBJECTS[change.path], change.before, change.after, unit);
    case 'name':
    case 'joint.scheme':
      return [text(SUBJECTS[change.path], change.before, change.after)];
    case 'lengthUnit':
      return [text(SUBJECTS.lengthUnit, UNIT_NAMES[change.before], UNIT_NAMES[change.after])];
    case 'build.way':
      return [text(SUBJECTS['build.way'], wayName(change.before), wayName(change.after))];
    case 'build.turnOver':
      return [text(SUBJECTS['build.turnOver'], yesNo(change.before), yesNo(change.after))];
    case 'build.spareShare':
      return [text(SUBJECTS['build.spareShare'], percent(change.before), percent(change.after))];
    case 'build.spareMinimum':
      return [text(SUBJECTS['build.spareMinimum'], `${change.before}`, `${change.after}`)];
    case 'cutter.diameter': {
      const [was, is] = [change.before, change.after].map((d) => formatCutter(d, unit));
      return [text(SUBJECTS['cutter.diameter'], was ?? '', is ?? '')];
    }
    default:
      return [lengths(SUBJECTS[change.path], change.before, change.after, unit)];
  }
}

const UNIT_NAMES: Readonly<Record<LengthUnit, string>> = { mm: 'millimetres', in: 'inches' };

/** The way of building as it is said in a sentence. */
export function wayName(way: Layout['build']['way']): string {
  return way.replaceAll('-', ' ');
}

/** What a switch shows; the value is data of the document. */
function yesNo(value: FieldChange['before']): string {
  return value === true ? 'yes' : 'no';
}

/** A share in percent, with a decimal where it has one. */
export function percent(share: number): string {
  return `${Number((share * 100).toFixed(1))} %`;
}

function jointFigures(
  joint: string,
  before: Parameters,
  after: Parameters,
  unit: LengthUnit,
): ChangedFigure[] {
  const was = parametersOf(before);
  const is = parametersOf(after);
  const profile =
    before.profile === after.profile
      ? []
      : [text(`${joint}, profile`, before.profile, after.profile)];
  const names = [...new Set([...was.keys(), ...is.keys()])];
  return [
    ...profile,
    ...names.flatMap((name) => {
      const [from, to] = [was.get(name), is.get(name)];
      if (from === to) return [];
      const subject = `${joint}, ${PARAMETER_NAMES[name] ?? name}`;
      if (name === 'flankAngle') return [text(subject, angle(from), angle(to))];
      if (from !== undefined && to !== undefined) return [lengths(subject, from, to, unit)];
      return [text(subject, lengthOrNone(from, unit), lengthOrNone(to, unit))];
    }),
  ];
}

function parametersOf(parameters: Parameters): Map<string, number> {
  return new Map(
    Object.entries(parameters).filter(
      (entry): entry is [string, number] => typeof entry[1] === 'number',
    ),
  );
}

function angle(value: number | undefined): string {
  return value === undefined ? 'none' : formatAngle(value);
}

function lengthOrNone(value: number | undefined, unit: LengthUnit): string {
  return value === undefined ? 'none' : formatLength(value, unit);
}

/** Two lengths as usual, or with as many decimals as it takes to tell them apart. */
function lengths(
  subject: string,
  before: Millimetres,
  after: Millimetres,
  unit: LengthUnit,
): ChangedFigure {
  const usual = text(subject, formatLength(before, unit), formatLength(after, unit));
  if (usual.before !== usual.after) return usual;
  const exact = (length: Millimetres) =>
    `${Number(fromMillimetres(length, unit).toFixed(6))} ${unit}`;
  return text(subject, exact(before), exact(after));
}

function changedWoods(before: readonly Wood[], after: readonly Wood[]): ChangedFigure[] {
  return after.flatMap((wood) => {
    const was = before.find(({ key }) => key === wood.key);
    if (!was) return [];
    const figures = [
      text(`${was.name}, name`, was.name, wood.name),
      { ...text(`${wood.name}, colour`, was.colour, wood.colour), kind: 'colour' as const },
      text(`${wood.name}, species`, was.species ?? 'none', wood.species ?? 'none'),
      text(`${wood.name}, sawn`, was.sawn, wood.sawn),
    ];
    return figures.filter((figure) => figure.before !== figure.after);
  });
}

function woodsComeAndGone(before: readonly Wood[], after: readonly Wood[]): string[] {
  const missingIn = (woods: readonly Wood[]) => (wood: Wood) =>
    !woods.some(({ key }) => key === wood.key);
  return [
    ...after.filter(missingIn(before)).map((wood) => `${wood.name} came in.`),
    ...before.filter(missingIn(after)).map((wood) => `${wood.name} was taken out.`),
  ];
}

function tileSentences(positions: readonly number[], before: Layout, after: Layout): string[] {
  const counts = new Map<string, number>();
  for (const position of positions) {
    const from = before.woods[before.cells[position] ?? 0]?.name ?? '';
    const to = after.woods[after.cells[position] ?? 0]?.name ?? '';
    const words = `from ${from} to ${to}`;
    counts.set(words, (counts.get(words) ?? 0) + 1);
  }
  return [...counts]
    .sort(([, a], [, b]) => b - a)
    .map(([words, count]) => `${counted(count, 'tile')} ${words}.`);
}

function text(subject: string, before: string, after: string): ChangedFigure {
  return { subject, before, after, kind: 'text' };
}
