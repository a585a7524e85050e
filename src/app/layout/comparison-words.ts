/** What changed between two layouts, in the reader's words and unit. */
import { formatCutter } from '@shared/checks/context';
import type { Comparison } from '@shared/layout/comparison';
import type { FieldChange } from '@shared/layout/patch';
import type { Joint, Layout, Wood } from '@shared/layout/schema';
import { formatAngle, formatLength } from '@shared/units/format';
import { fromMillimetres, type LengthUnit, type Millimetres } from '@shared/units/length';
import { fieldName, fieldValue } from './field-names';

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
    text(fieldName('shell.staves'), `${before.staves}`, `${after.staves}`),
    text(fieldName('shell.courses'), `${before.courses}`, `${after.courses}`),
  ].filter((figure) => figure.before !== figure.after);
}

function figuresOf(change: FieldChange, unit: LengthUnit): ChangedFigure[] {
  const subject = fieldName(change.path);
  switch (change.path) {
    case 'woods':
      return [];
    case 'joint.staveJoint':
    case 'joint.courseJoint':
      return jointFigures(change.path, change.before, change.after, unit);
    case 'name':
    case 'lengthUnit':
    case 'joint.scheme':
    case 'build.way':
    case 'build.turnOver':
    case 'build.spareMinimum': {
      const words = (value: unknown) => fieldValue(change.path, value, unit);
      return [text(subject, words(change.before), words(change.after))];
    }
    case 'build.spareShare':
      return [text(subject, percent(change.before), percent(change.after))];
    case 'cutter.diameter': {
      const size = (diameter: Millimetres) => formatCutter(diameter, unit);
      return [text(subject, size(change.before), size(change.after))];
    }
    default:
      return [lengths(subject, change.before, change.after, unit)];
  }
}

/** A share in percent, with a decimal where it has one. */
function percent(share: number): string {
  return `${Number((share * 100).toFixed(1))} %`;
}

function jointFigures(
  joint: 'joint.staveJoint' | 'joint.courseJoint',
  before: Parameters,
  after: Parameters,
  unit: LengthUnit,
): ChangedFigure[] {
  const was = parametersOf(before);
  const is = parametersOf(after);
  const profile =
    before.profile === after.profile
      ? []
      : [text(fieldName(`${joint}.profile`), before.profile, after.profile)];
  const names = [...new Set([...was.keys(), ...is.keys()])];
  return [
    ...profile,
    ...names.flatMap((name) => {
      const [from, to] = [was.get(name), is.get(name)];
      if (from === to) return [];
      const subject = fieldName(`${joint}.${name}`);
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
