/**
 * Where tab and socket lie when they are drawn apart. Everything is laid out in the joint's own frame:
 * `along` its edge, `out` of the tab piece. A course joint is drawn upright, a stave joint lying, so that
 * the grain always runs upright, as it does in the shell.
 */
import { edgeProfile, type EdgeProfile } from '@shared/joint/edge-profile';
import type { Layout } from '@shared/layout/schema';
import { tileOutline, type TileOutline } from '@shared/pieces/tile-outline';
import type { TileEdges } from '@shared/pieces/tile-edges';
import type { Millimetres } from '@shared/units/length';
import type { PixelPoint, PixelSize, View } from './picture-model';

export type JointName = 'staveJoint' | 'courseJoint';

/** One of the two pieces: its outline to cut, and where its tile lies. */
export interface JointPiece {
  readonly outline: TileOutline;
  readonly view: View;
}

export interface JointFrame {
  readonly joint: JointName;
  readonly profile: EdgeProfile;
  readonly pixelsPerMm: number;
  /** Gap between the two edge lines as drawn. */
  readonly apart: Millimetres;
  readonly tab: JointPiece;
  readonly socket: JointPiece;
  /** The box the pieces are drawn in; they are cut off at it. */
  readonly window: { readonly at: PixelPoint; readonly size: PixelSize };
  /** The pixel of a point of the joint's frame. */
  readonly point: (along: Millimetres, out: Millimetres) => PixelPoint;
}

const FLAT: TileEdges = { left: 'flat', right: 'flat', bottom: 'flat', top: 'flat' };

const SIDES: Readonly<Record<JointName, { tab: TileEdges; socket: TileEdges }>> = {
  courseJoint: { tab: { ...FLAT, top: 'tab' }, socket: { ...FLAT, bottom: 'socket' } },
  staveJoint: { tab: { ...FLAT, right: 'tab' }, socket: { ...FLAT, left: 'socket' } },
};

/** Room beside the pieces for the figure of the reach, and around them, in pixels. */
const BESIDE = 62;
const AROUND = 16;

/** Pixels of a millimetre at full size: CSS inches have 96 pixels. */
export const FULL_SIZE = 96 / 25.4;

/** The frame of one joint of a layout whose joints close, in a picture of this size. */
export function jointFrame(layout: Layout, joint: JointName, size: PixelSize): JointFrame {
  const profile = edgeProfile(layout.joint[joint]);
  const apart = apartOf(profile, layout.cutter.diameter);
  const upright = joint === 'courseJoint';
  const window = windowOf(joint, size);
  const pixelsPerMm = scaleOf(layout, joint, profile, apart, window.size);
  const middle = (apart + profile.reach) / 2;
  const centre = {
    x: window.at.x + window.size.width / 2,
    y: window.at.y + window.size.height / 2,
  };
  const point = (along: Millimetres, out: Millimetres) => {
    const [x, y] = upright ? [along, out - middle] : [out - middle, along];
    return { x: centre.x + x * pixelsPerMm, y: centre.y - y * pixelsPerMm };
  };
  const depth = (upright ? layout.shell.tileHeight : layout.shell.tileWidth) / 2;
  const piece = (half: 'tab' | 'socket', out: Millimetres): JointPiece => ({
    outline: tileOutline(layout, SIDES[joint][half]),
    view: { pixelsPerMm, origin: point(0, out) },
  });
  return {
    joint,
    profile,
    pixelsPerMm,
    apart,
    tab: piece('tab', -depth),
    socket: piece('socket', apart + depth),
    window,
    point,
  };
}

/** Far enough apart for the cutter to be seen between the pieces, near enough to see them belong together. */
function apartOf({ reach }: EdgeProfile, cutter: Millimetres): Millimetres {
  return Math.min(Math.max(cutter * 1.12, reach * 0.46), reach * 1.1);
}

function windowOf(joint: JointName, { width, height }: PixelSize): JointFrame['window'] {
  return joint === 'courseJoint'
    ? {
        at: { x: AROUND, y: 8 },
        size: { width: width - AROUND - BESIDE, height: height - AROUND },
      }
    : {
        at: { x: AROUND, y: 8 },
        size: { width: width - 2 * AROUND, height: height - AROUND - BESIDE },
      };
}

function scaleOf(
  layout: Layout,
  joint: JointName,
  profile: EdgeProfile,
  apart: Millimetres,
  { width, height }: PixelSize,
): number {
  const upright = joint === 'courseJoint';
  const edge = upright ? layout.shell.tileWidth : layout.shell.tileHeight;
  const widest = Math.max(2 * profile.shoulder, profile.headWidth);
  const along = Math.min(edge + 0.5, widest * 2.6);
  const out = apart + profile.reach + 2 * profile.reach;
  const [alongPixels, outPixels] = upright ? [width, height] : [height, width];
  return Math.max(0.1, Math.min(alongPixels / along, outPixels / out));
}
