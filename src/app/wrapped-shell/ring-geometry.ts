/**
 * The ring after turning, as triangles: outer and bored wall with true thickness, both trimmed ends. Stands
 * on y = 0 with its axis upright; the seam faces the viewer (+z) and staves run to the right as seen from
 * outside. Texture coordinates point into the unrolled picture: u round the shell, v up its untrimmed height;
 * an end shows the colours of its trim line.
 */
import { BufferAttribute, BufferGeometry } from 'three';
import { trimOf } from '@shared/shell/trim';
import type { Shell } from '@shared/layout/schema';
import type { Millimetres } from '@shared/units/length';

/** Fine enough that the turned circle shows no corners at 2000 px. */
const STEPS = 360;

/** One point of the ring's cross-section, outside running on to the top, the inside and the bottom. */
interface Station {
  readonly radius: Millimetres;
  readonly height: Millimetres;
  readonly v: number;
}

/** The four faces of the ring, each with its own normals. */
export function ringFaces(shell: Shell): BufferGeometry[] {
  const { lower, upper, untrimmedHeight } = trimOf(shell);
  const [outer, inner] = [shell.finishedOuterDiameter / 2, shell.finishedInnerDiameter / 2];
  const [from, to] = [Math.max(0, lower), Math.min(untrimmedHeight, upper)];
  const at = (radius: Millimetres, y: Millimetres): Station => ({
    radius,
    height: y - from,
    v: y / untrimmedHeight,
  });
  const sections: readonly (readonly [Station, Station])[] = [
    [at(outer, from), at(outer, to)],
    [at(outer, to), at(inner, to)],
    [at(inner, to), at(inner, from)],
    [at(inner, from), at(outer, from)],
  ];
  return sections.map(([a, b]) => faceBetween(a, b));
}

function faceBetween(a: Station, b: Station): BufferGeometry {
  const positions: number[] = [];
  const normals: number[] = [];
  const textures: number[] = [];
  const length = Math.hypot(b.radius - a.radius, b.height - a.height);
  // square to the section, outward: (along radius, along height)
  const normal = { out: (b.height - a.height) / length, up: (a.radius - b.radius) / length };
  for (let step = 0; step <= STEPS; step++) {
    const u = step / STEPS;
    const [sine, cosine] = [Math.sin(2 * Math.PI * u), Math.cos(2 * Math.PI * u)];
    for (const station of [a, b]) {
      positions.push(station.radius * sine, station.height, station.radius * cosine);
      normals.push(normal.out * sine, normal.up, normal.out * cosine);
      textures.push(u, station.v);
    }
  }
  const geometry = new BufferGeometry();
  geometry.setAttribute('position', new BufferAttribute(new Float32Array(positions), 3));
  geometry.setAttribute('normal', new BufferAttribute(new Float32Array(normals), 3));
  geometry.setAttribute('uv', new BufferAttribute(new Float32Array(textures), 2));
  geometry.setIndex(
    Array.from({ length: STEPS }, (_, step) => {
      const corner = 2 * step;
      return [corner, corner + 2, corner + 1, corner + 1, corner + 2, corner + 3];
    }).flat(),
  );
  return geometry;
}
