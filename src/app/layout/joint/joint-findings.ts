import { runShapeChecks } from '@shared/checks/run-checks';
import { gapsWithTaper } from '@shared/joint/taper';
import type { Layout } from '@shared/layout/schema';
import { layoutFit } from '@shared/pieces/layout-fit';
import { formatCutterFigure, formatLength } from '@shared/units/format';
import type { LengthUnit, Millimetres } from '@shared/units/length';
import { edgeProfile } from '@shared/joint/edge-profile';
import { findingOf, type Finding } from '../findings';

/** What is true of these joints, in sentences: the radii first, then the checks of the joint. */
export function jointFindings(layout: Layout, lengthUnit: LengthUnit): Finding[] {
  const checks = runShapeChecks(layout, { lengthUnit }).filter(
    (check) => check.station === 'joint',
  );
  const state = checks.find((check) => check.key === 'inside-radius')?.result ?? 'clear';
  const radii: Finding = { state, text: radiiText(layout, lengthUnit) };
  return [radii, ...checks.map(findingOf)];
}

function radiiText({ joint, cutter }: Layout, unit: LengthUnit): string {
  const inset = joint.clearance / 2;
  const least = (which: 'footRadius' | 'headRadius') =>
    Math.min(edgeProfile(joint.staveJoint)[which], edgeProfile(joint.courseJoint)[which]) + inset;
  const length = (value: Millimetres) => formatLength(value, unit);
  return (
    `Cut with clearance, the tab piece has an inside radius of ${length(least('footRadius'))}, ` +
    `the socket piece of ${length(least('headRadius'))}. The cutter needs ${length(cutter.diameter / 2)}.`
  );
}

/** The largest cutter that fits every piece, and what sets it. */
export interface LargestCutter {
  readonly figure: string;
  readonly setBy: string;
}

export function largestCutter(layout: Layout, unit: LengthUnit): LargestCutter {
  const fit = layoutFit(layout);
  if (!Number.isFinite(fit.largestCutter)) {
    return { figure: 'any', setBy: 'no inside corner limits it' };
  }
  const figure = `${formatCutterFigure(fit.largestCutter, unit)} ${unit}`;
  if (fit.limitedBy === 'reach-in' || !fit.place) {
    return { figure, setBy: 'set by the room to get in' };
  }
  const along = fit.place.side === 'left' || fit.place.side === 'right';
  const joint = along ? layout.joint.staveJoint : layout.joint.courseJoint;
  const parts = joint.profile === 'round' ? ['neck fillet', 'head'] : ['root fillet', 'tip'];
  const part = fit.place.edge === 'tab' ? parts[0] : parts[1];
  return { figure, setBy: `set by the ${part} of the ${along ? 'stave' : 'course'} joint` };
}

/** What a taper would do to the joint, turned over or not. */
export function taperText(layout: Layout, taper: Millimetres, unit: LengthUnit): string {
  const { clearance } = layout.joint;
  const turned = gapsWithTaper(clearance, taper, 'turned-over');
  const straight = gapsWithTaper(clearance, taper, 'same-way-up');
  const length = (value: Millimetres) => formatLength(value, unit);
  const even =
    turned.narrow > 0
      ? `the gap stays even at ${length(turned.narrow)}`
      : `${length(-turned.narrow)} of wood is in the way`;
  const closing =
    straight.narrow > 0
      ? `it closes to ${length(straight.narrow)} on one face`
      : `${length(-straight.narrow)} of wood is in the way on one face`;
  return `With a taper of ${length(taper)} over the board, every other piece cut face down: ${even}. All face up, ${closing}.`;
}
