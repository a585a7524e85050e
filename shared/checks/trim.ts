import { socketDepth } from '../pieces/layout-fit';
import { trimOf } from '../shell/trim';
import type { Millimetres } from '../units/length';
import type { CheckResult } from './check';
import type { Check, CheckContext } from './context';

/** Whether the courses make the finished height, and what the trim lines cut. */
export const trim: Check = (context) => ({
  key: 'trim',
  station: 'shell',
  title: 'Trim',
  figure: { value: trimOf(context.layout.shell).eachEnd, kind: 'length' },
  limit: { value: greatestTrim(context), kind: 'length' },
  reason: 'What is trimmed off the ends must not open a joint or leave a sliver that breaks out.',
  ...held(context),
});

/** The trim held against the end tiles; a caution brings the limit it is about. */
function held(
  context: CheckContext,
): Pick<CheckResult, 'result' | 'finding' | 'remedy'> & Partial<Pick<CheckResult, 'limit'>> {
  const { layout, length } = context;
  const { courses, finishedHeight } = layout.shell;
  const { untrimmedHeight, eachEnd } = trimOf(layout.shell);
  const made = `${courses} ${courses === 1 ? 'course makes' : 'courses make'} ${length(untrimmedHeight)}`;
  if (eachEnd < -1e-9) {
    return {
      result: 'stop',
      finding: `${made}, less than the finished height of ${length(finishedHeight)}.`,
      remedy: `Add a course or taller tiles, or finish at ${length(untrimmedHeight)} or less.`,
    };
  }
  const trimmed = `${made}; ${length(Math.max(0, eachEnd))} is trimmed at each end`;
  const most = greatestTrim(context);
  if (eachEnd > most + 1e-9) {
    const least = length(untrimmedHeight - 2 * Math.max(0, most));
    return {
      result: 'stop',
      finding: `${trimmed}, past the course joint of the end tiles.`,
      remedy: `Take a course less, or finish at ${least} or more.`,
    };
  }
  const spoiled = eachEnd > 1e-9 ? spoiledBy(eachEnd, context) : null;
  if (spoiled) {
    return {
      result: 'caution',
      limit: { value: spoiled.limit, kind: 'length' },
      finding: `${trimmed}, which ${spoiled.words}.`,
      remedy: 'Change the finished height or the height of the tiles.',
    };
  }
  return { result: 'clear', finding: `${trimmed}.`, remedy: '' };
}

/** The most that can be trimmed before the line meets the end tile's course joint. */
function greatestTrim({ layout }: CheckContext): Millimetres {
  const { courses, tileHeight } = layout.shell;
  if (courses === 1) return tileHeight / 2;
  return tileHeight - socketDepth(layout.joint.courseJoint.reach, layout.joint.clearance);
}

/** What a trim line spoils of the end tile's stave joint or of the web above it, or null. */
function spoiledBy(
  eachEnd: Millimetres,
  context: CheckContext,
): { readonly words: string; readonly limit: Millimetres } | null {
  const { layout, joints, webMinimum, length } = context;
  const { tileHeight } = layout.shell;
  const head = (joints[0]?.profile.headWidth ?? 0) / 2 + layout.joint.clearance / 2;
  const [from, to] = [tileHeight / 2 - head, tileHeight / 2 + head];
  const before = Math.max(0, from - webMinimum);
  if (eachEnd > from && eachEnd < to) {
    return { words: 'cuts the stave joint of the end tiles', limit: before };
  }
  const end = eachEnd <= from ? from : greatestTrim(context);
  const left = end - eachEnd;
  if (left >= webMinimum) return null;
  const where = eachEnd <= from ? 'beside the stave joint' : 'under the course joint';
  return {
    words: `leaves only ${length(left)} of wood ${where}`,
    limit: Math.max(0, end - webMinimum),
  };
}
