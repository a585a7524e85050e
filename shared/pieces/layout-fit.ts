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

/** How a cutter fits all outlines of a layout, and which of them is hardest to cut. */
export interface LayoutFit extends CutterFit {
  /** The side of the tile with the tightest inside radius, and what that side carries. */
  readonly place: { readonly side: Side; readonly edge: 'tab' | 'socket' } | null;
  /** The outline with the tightest inside radius. */
  readonly hardest: LayoutOutline;
}

/**
 * The fit of the layout's own cutter over all its outlines. The tightest radius, a crossing path and the
 * smallest largest cutter may come from three different ones: a cutter must make them all.
 */
export function layoutFit(layout: Layout, outlines = layoutOutlines(layout)): LayoutFit {
  const fits = outlines.map((hardest) => {
    const fit = cutterFit(hardest.outline, layout.cutter.diameter);
    return { ...fit, hardest, place: placeOf(fit, hardest) };
  });
  const tightest = fits.reduce((a, b) => (radiusOf(b) < radiusOf(a) - 1e-9 ? b : a));
  const smallest = fits.reduce((a, b) => (b.largestCutter < a.largestCutter ? b : a));
  return {
    ...tightest,
    fits: fits.every((fit) => fit.fits),
    crossingAt: fits.find((fit) => fit.crossingAt)?.crossingAt ?? null,
    largestCutter: smallest.largestCutter,
    limitedBy: smallest.limitedBy,
  };
}

function radiusOf(fit: CutterFit): Millimetres {
  return fit.tightest?.radius ?? Infinity;
}

function placeOf(fit: CutterFit, { edges, outline }: LayoutOutline): LayoutFit['place'] {
  const side = fit.tightest && outline.sides[fit.tightest.segment];
  if (!side || edges[side] === 'flat') return null;
  return { side, edge: edges[side] };
}

/** The least wood around the sockets of one tile. */
export interface Webs {
  /** Between two sockets. */
  readonly betweenSockets: Gap | null;
  /** Between a socket and a side of the tile that has none. */
  readonly besideSockets: Gap | null;
}

/** The thinnest webs over all outlines of a layout; null where no tile has such a pair. */
export function layoutWebs(outlines: readonly LayoutOutline[]): Webs {
  const betweenSockets: Gap[] = [];
  const besideSockets: Gap[] = [];
  for (const { edges, outline } of outlines) {
    for (const socket of SIDES.filter((side) => edges[side] === 'socket')) {
      const hollow = withoutShoulders(segmentsOf(outline, socket));
      for (const other of SIDES.filter((side) => side !== socket)) {
        if (edges[other] === 'socket') {
          betweenSockets.push(leastGap(hollow, withoutShoulders(segmentsOf(outline, other))));
        } else {
          const wall =
            other === ACROSS[socket] ? hollow : hollow.filter((segment) => !isLip(segment));
          besideSockets.push(leastGap(wall, segmentsOf(outline, other)));
        }
      }
    }
  }
  return { betweenSockets: thinnest(betweenSockets), besideSockets: thinnest(besideSockets) };
}

const SIDES: readonly Side[] = ['left', 'right', 'bottom', 'top'];

const ACROSS: Readonly<Record<Side, Side>> = {
  left: 'right',
  right: 'left',
  bottom: 'top',
  top: 'bottom',
};

function thinnest(gaps: readonly Gap[]): Gap | null {
  return gaps.reduce<Gap | null>((a, b) => (!a || b.distance < a.distance ? b : a), null);
}

function segmentsOf(outline: TileOutline, side: Side): Segment[] {
  return outline.segments.filter((_, i) => outline.sides[i] === side);
}

/**
 * The rounded lips of a socket end near the tile's corners by design; the wood that may be thin between a
 * socket and its neighbouring sides lies beside the hollow behind them.
 */
function isLip(segment: Segment): boolean {
  return segment.kind === 'arc' && segment.sweep > 0;
}

/** The shoulders are the lines along the tile's edge: those that end at its corners. */
function withoutShoulders(segments: readonly Segment[]): Segment[] {
  const from = segments[0]?.kind === 'line' ? 1 : 0;
  const to = segments.at(-1)?.kind === 'line' ? -1 : undefined;
  return segments.slice(from, to);
}

/** How far a joint reaches into the tile that carries its socket, clearance included. */
export function socketDepth(reach: Millimetres, clearance: Millimetres): Millimetres {
  return reach + clearance / 2;
}
