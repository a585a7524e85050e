import { leastGap, type Gap } from '../geometry/distance';
import type { Segment } from '../geometry/segment';
import { cutterFit, type CutterFit } from '../joint/cutter-fit';
import type { Layout } from '../layout/schema';
import type { Millimetres } from '../units/length';
import { tileEdges, type Side, type TileEdges } from './tile-edges';
import { edgesKey, tileOutline, type TileOutline } from './tile-outline';

/** One of the few different outlines of a layout. */
export interface LayoutOutline {
  readonly edges: TileEdges;
  readonly outline: TileOutline;
}

/** Every different outline of a layout, with clearance; a handful whatever its size. */
export function layoutOutlines(layout: Layout): LayoutOutline[] {
  const { courses } = layout.shell;
  const found = new Map<string, TileEdges>();
  for (const course of new Set([
    0,
    Math.min(1, courses - 1),
    Math.min(2, courses - 1),
    courses - 1,
  ])) {
    for (const stave of [0, 1]) {
      const edges = tileEdges(layout.joint.scheme, layout.shell, stave, course);
      found.set(edgesKey(edges), edges);
    }
  }
  return [...found.values()].map((edges) => ({ edges, outline: tileOutline(layout, edges) }));
}

/** How a cutter fits the outline that is hardest to cut, and where on it. */
export interface LayoutFit extends CutterFit {
  /** The side of the tile with the tightest inside radius, and what that side carries. */
  readonly place: { readonly side: Side; readonly edge: 'tab' | 'socket' } | null;
  readonly hardest: LayoutOutline;
}

/** The fit of the layout's own cutter over all its outlines: the tightest radius, the smallest largest cutter. */
export function layoutFit(layout: Layout, outlines = layoutOutlines(layout)): LayoutFit {
  const fits = outlines.map((hardest) => {
    const fit = cutterFit(hardest.outline, layout.cutter.diameter);
    return { ...fit, hardest, place: placeOf(fit, hardest) };
  });
  return fits.reduce((worst, fit) => (isHarder(fit, worst) ? fit : worst));
}

function isHarder(fit: LayoutFit, than: LayoutFit): boolean {
  if (fit.fits !== than.fits) return !fit.fits;
  const [radius, known] = [fit.tightest?.radius ?? Infinity, than.tightest?.radius ?? Infinity];
  if (Math.abs(radius - known) > 1e-9) return radius < known;
  return fit.largestCutter < than.largestCutter;
}

function placeOf(fit: CutterFit, { edges, outline }: LayoutOutline): LayoutFit['place'] {
  const side = fit.tightest && outline.sides[fit.tightest.segment];
  if (!side || edges[side] === 'flat') return null;
  return { side, edge: edges[side] };
}

/** The least wood between two sockets of one tile, and between a socket and the tile's other sides. */
export interface Webs {
  readonly betweenSockets: Gap | null;
  readonly besideSockets: Gap | null;
}

/** The thinnest webs over all outlines of a layout; null where no tile has such a pair. */
export function layoutWebs(outlines: readonly LayoutOutline[]): Webs {
  const betweenSockets: Gap[] = [];
  const besideSockets: Gap[] = [];
  for (const { edges, outline } of outlines) {
    const sockets = SIDES.filter((side) => edges[side] === 'socket');
    for (const socket of sockets) {
      const hollow = hollowOf(outline, socket);
      for (const other of SIDES.filter((side) => side !== socket)) {
        if (edges[other] === 'socket') {
          betweenSockets.push(leastGap(hollow, hollowOf(outline, other)));
        } else {
          besideSockets.push(leastGap(hollow, segmentsOf(outline, other)));
        }
      }
    }
  }
  return { betweenSockets: thinnest(betweenSockets), besideSockets: thinnest(besideSockets) };
}

const SIDES: readonly Side[] = ['left', 'right', 'bottom', 'top'];

function thinnest(gaps: readonly Gap[]): Gap | null {
  return gaps.reduce<Gap | null>((a, b) => (!a || b.distance < a.distance ? b : a), null);
}

function segmentsOf(outline: TileOutline, side: Side): Segment[] {
  return outline.segments.filter((_, i) => outline.sides[i] === side);
}

/** A socket without its two shoulders. */
function hollowOf(outline: TileOutline, side: Side): Segment[] {
  const segments = segmentsOf(outline, side);
  const from = segments[0]?.kind === 'line' ? 1 : 0;
  const to = segments.at(-1)?.kind === 'line' ? -1 : undefined;
  return segments.slice(from, to);
}

/** How far a joint reaches into the tile that carries its socket, clearance included. */
export function socketDepth(reach: Millimetres, clearance: Millimetres): Millimetres {
  return reach + clearance / 2;
}
