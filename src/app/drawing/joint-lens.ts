/**
 * A stave joint in section through a course of tabs, in the frame of the joint: u square to the joint's
 * radial plane, ρ along it. The left stave's faces rise to the right (ρ = (a + u sin β) / cos β), the right
 * one's fall; the tab keeps its own stave's plane beyond the joint line, which is why it stands proud.
 */
import type { ArcSegment } from '@shared/geometry/segment';
import type { Layout } from '@shared/layout/schema';
import type { Ring } from '@shared/shell/ring';
import { toRadians } from '@shared/units/angle';
import type { Millimetres, PointMm } from '@shared/units/length';
import { polygon, type Mark, type PixelPoint, type View, type WoodFill } from './picture-model';

/** Height of a stave's face over the axis at u, on the left (rising) or right (falling) stave. */
export function faceHeight(
  ring: Ring,
  depth: Millimetres,
  u: Millimetres,
  stave: 'left' | 'right',
): Millimetres {
  const beta = toRadians(ring.bevel);
  const lean = (stave === 'left' ? u : -u) * Math.sin(beta);
  return (ring.apothem - depth + lean) / Math.cos(beta);
}

/** The marks inside the lens, before the window cuts them round. */
export function jointLensMarks(
  layout: Layout,
  ring: Ring,
  lens: { readonly centre: PixelPoint; readonly radius: number },
): Mark[] {
  const { boardThickness } = layout.shell;
  const { reach } = layout.joint.staveJoint;
  const inset = layout.joint.clearance / 2;
  const shown = Math.max(boardThickness * 0.85, reach * 0.95);
  const view = viewOf(ring, boardThickness, reach, lens, shown);
  const far = shown * 2.2 + reach;
  const [left, right] = woodsOf(layout);
  const shaped = (from: Millimetres, to: Millimetres, stave: 'left' | 'right', wood: WoodFill) =>
    woodMark(sectionOf(ring, boardThickness, from, to, stave), view, wood);
  return [
    { kind: 'circle', ...lens, look: 'ground' },
    shaped(reach + inset, far, 'right', right),
    shaped(-far, -inset, 'left', left),
    shaped(-inset, reach - inset, 'left', { ...left, shade: 'shaded' }),
    ...turnedArcs(layout, view, far),
  ];
}

function viewOf(
  ring: Ring,
  board: Millimetres,
  reach: Millimetres,
  lens: { readonly centre: PixelPoint; readonly radius: number },
  shown: Millimetres,
): View {
  const pixelsPerMm = lens.radius / shown;
  const middle = faceHeight(ring, board / 2, 0, 'left');
  return {
    pixelsPerMm,
    origin: {
      x: lens.centre.x - (reach / 2) * pixelsPerMm,
      y: lens.centre.y + middle * pixelsPerMm,
    },
  };
}

function woodsOf({ woods }: Layout): [WoodFill, WoodFill] {
  const colour = (index: number) => (woods[index] ?? woods[0])?.colour ?? '#C8B08A';
  return [
    { colour: colour(0), grain: null },
    { colour: colour(1), grain: null },
  ];
}

function sectionOf(
  ring: Ring,
  board: Millimetres,
  from: Millimetres,
  to: Millimetres,
  stave: 'left' | 'right',
): PointMm[] {
  const at = (u: Millimetres, depth: Millimetres) => ({
    x: u,
    y: faceHeight(ring, depth, u, stave),
  });
  return [at(from, board), at(to, board), at(to, 0), at(from, 0)];
}

function woodMark(points: readonly PointMm[], view: View, wood: WoodFill): Mark {
  return { kind: 'path', segments: polygon(points), view, look: 'wood', wood };
}

function turnedArcs({ shell }: Layout, view: View, far: Millimetres): Mark[] {
  return [shell.finishedOuterDiameter, shell.finishedInnerDiameter].map((diameter) => {
    const half = Math.asin(Math.min(1, (2 * far) / diameter));
    const arc: ArcSegment = {
      kind: 'arc',
      centre: { x: 0, y: 0 },
      radius: diameter / 2,
      startAngle: Math.PI / 2 - half,
      sweep: 2 * half,
    };
    return { kind: 'path', segments: [arc], view, look: 'turned' };
  });
}
