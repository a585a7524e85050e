import type { DxfPoint } from './dxf-parser-reading';

/** Area inside a closed polyline with bulges: under its chords, and the circular segment of each arc. */
export function polylineArea(points: readonly DxfPoint[]): number {
  return points.reduce((sum, [x, y, bulge], index) => {
    const [x2, y2] = points[(index + 1) % points.length] ?? [x, y];
    const chord = (x * y2 - x2 * y) / 2;
    if (bulge === 0) return sum + chord;
    const angle = 4 * Math.atan(bulge);
    const radius = Math.hypot(x2 - x, y2 - y) / 2 / Math.sin(angle / 2);
    return sum + chord + (radius ** 2 * (angle - Math.sin(angle))) / 2;
  }, 0);
}
