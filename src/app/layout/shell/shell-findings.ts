import { runShapeChecks } from '@shared/checks/run-checks';
import type { Layout } from '@shared/layout/schema';
import { ringOf } from '@shared/shell/ring';
import { formatAngle, formatLength } from '@shared/units/format';
import type { LengthUnit } from '@shared/units/length';
import { findingOf, type Finding } from '../findings';

/** What is true of this ring, in sentences: its figures first, then the checks of the shell. */
export function shellFindings(layout: Layout, lengthUnit: LengthUnit): Finding[] {
  const { shell } = layout;
  const ring = ringOf(shell, layout.joint.staveJoint.reach);
  const length = (value: number) => formatLength(value, lengthUnit);
  const checks = runShapeChecks(layout, { lengthUnit }).filter(
    (check) => check.station === 'shell',
  );
  const bevel: Finding = {
    state: 'clear',
    text: `Each edge is bevelled ${formatAngle(ring.bevel)}; a joint turns ${formatAngle(ring.jointTurn)}.`,
  };
  const flats: Finding = {
    state: 'clear',
    text:
      `${length(ring.acrossFlats)} across the flats, turned to ${length(shell.finishedOuterDiameter)}: ` +
      `${length(ring.turnedAway)} comes off the middle of each stave.`,
  };
  const enough = ring.turnedAway >= shell.skimAllowance - 1e-9;
  return [bevel, ...(enough ? [flats] : []), ...checks.map(findingOf)];
}
