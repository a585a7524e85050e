import { edgeProfile, mouthOf, type EdgeProfile } from '../joint/edge-profile';
import type { JointParameters } from '../joint/parameters';
import type { Layout } from '../layout/schema';
import {
  layoutFit,
  layoutOutlines,
  layoutWebs,
  type LayoutFit,
  type LayoutOutline,
  type Webs,
} from '../pieces/layout-fit';
import { ringOf, type Ring } from '../shell/ring';
import { formatCutterFigure, formatLength } from '../units/format';
import { fromMillimetres, toMillimetres, type LengthUnit, type Millimetres } from '../units/length';
import { FINISHING_MARGIN, WEB_MINIMUM_MM, type CheckResult, type CheckSettings } from './check';

/** One joint of the layout with its name in sentences. */
export interface NamedJoint {
  readonly name: 'stave joint' | 'course joint';
  readonly parameters: JointParameters;
  readonly profile: EdgeProfile;
  /** The socket's narrowest opening, or null for a wave. */
  readonly mouth: Millimetres | null;
}

/** What the checks share, computed once. */
export interface CheckContext {
  readonly layout: Layout;
  readonly finishingMargin: number;
  readonly webMinimum: Millimetres;
  /** The joints its tiles have: the stave joint first, and the course joint when there are courses to join. */
  readonly joints: readonly NamedJoint[];
  readonly outlines: readonly LayoutOutline[];
  readonly fit: LayoutFit;
  readonly webs: Webs;
  readonly ring: Ring;
  /** A length in the reader's unit: "1.40 mm". */
  readonly length: (length: Millimetres) => string;
  /** A cutter's diameter with a third decimal where it has one: "3.175 mm". */
  readonly cutter: (diameter: Millimetres) => string;
  /** The same for a cutter that is offered: never rounded up, or it would not fit. */
  readonly offeredCutter: (diameter: Millimetres) => string;
}

/** A check: from what is shared to what was found. */
export type Check = (context: CheckContext) => CheckResult;

/** Computes what the checks share. The layout must hold together (see `problemsOf`). */
export function checkContext(layout: Layout, settings: CheckSettings): CheckContext {
  const unit = settings.lengthUnit ?? layout.lengthUnit;
  const { staveJoint, courseJoint, clearance } = layout.joint;
  const outlines = layoutOutlines(layout);
  return {
    layout,
    finishingMargin: settings.finishingMargin ?? FINISHING_MARGIN,
    webMinimum: settings.webMinimum ?? WEB_MINIMUM_MM,
    joints: [
      namedJoint('stave joint', staveJoint, clearance),
      // a single course is flat at both ends
      ...(layout.shell.courses > 1 ? [namedJoint('course joint', courseJoint, clearance)] : []),
    ],
    outlines,
    fit: layoutFit(layout, outlines),
    webs: layoutWebs(outlines),
    ring: ringOf(layout.shell, staveJoint.reach),
    length: (length) => formatLength(length, unit),
    cutter: (diameter) => formatCutter(diameter, unit),
    offeredCutter: (diameter) => formatCutter(roundedDown(diameter, unit), unit),
  };
}

function namedJoint(
  name: NamedJoint['name'],
  parameters: JointParameters,
  clearance: Millimetres,
): NamedJoint {
  const mouth = mouthOf(parameters, clearance);
  return { name, parameters, profile: edgeProfile(parameters), mouth };
}

/** A cutter's size as sentences name it: "3.175 mm", "2.8 mm", "0.125 in". */
export function formatCutter(diameter: Millimetres, unit: LengthUnit): string {
  const figure = formatCutterFigure(diameter, unit);
  return `${unit === 'mm' ? Number(figure) : figure} ${unit}`;
}

/** To the third decimal of the reader's unit, towards the smaller cutter. */
function roundedDown(diameter: Millimetres, unit: LengthUnit): Millimetres {
  return toMillimetres(Math.floor(fromMillimetres(diameter, unit) * 1000 + 1e-6) / 1000, unit);
}
