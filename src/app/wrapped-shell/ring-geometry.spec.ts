import { startingLayout } from '@shared/layout/starting-layout';
import { Vector3, type BufferGeometry } from 'three';
import { describe, expect, it } from 'vitest';
import { ringFaces } from './ring-geometry';

const shell = {
  ...startingLayout('Test').shell,
  finishedOuterDiameter: 224,
  finishedInnerDiameter: 206,
  finishedHeight: 228,
};

function points(face: BufferGeometry): Vector3[] {
  const position = face.getAttribute('position');
  return Array.from({ length: position.count }, (_, i) =>
    new Vector3().fromBufferAttribute(position, i),
  );
}

/** Volume enclosed by triangles that all turn the same way (divergence theorem). */
function volumeOf(faces: readonly BufferGeometry[]): number {
  return faces.reduce((sum, face) => {
    const corners = points(face);
    const index = face.getIndex()?.array ?? [];
    let volume = 0;
    for (let i = 0; i < index.length; i += 3) {
      const [a, b, c] = [
        corners[index[i] ?? 0],
        corners[index[i + 1] ?? 0],
        corners[index[i + 2] ?? 0],
      ];
      if (a && b && c) volume += a.dot(b.clone().cross(c)) / 6;
    }
    return sum + volume;
  }, 0);
}

describe('the ring as triangles', () => {
  const faces = ringFaces(shell);

  it('has the turned outside, the bore and the finished height', () => {
    const all = faces.flatMap(points);
    const radii = all.map(({ x, z }) => Math.hypot(x, z));
    expect(Math.max(...radii)).toBeCloseTo(112, 4);
    expect(Math.min(...radii)).toBeCloseTo(103, 4);
    expect(Math.min(...all.map(({ y }) => y))).toBeCloseTo(0, 6);
    expect(Math.max(...all.map(({ y }) => y))).toBeCloseTo(228, 4);
  });

  it('encloses the volume of the wall, so every triangle faces outward', () => {
    // the volume of a hollow cylinder, π (R² − r²) h; 360 chords fall short by 5e-5 of it
    const exact = Math.PI * (112 ** 2 - 103 ** 2) * 228;
    expect(volumeOf(faces) / exact).toBeCloseTo(1, 3);
  });

  it('shows the picture between the trim lines, and the colours of the trim lines on the ends', () => {
    const heights = faces.map((face) => {
      const uv = face.getAttribute('uv');
      return Array.from({ length: uv.count }, (_, i) => uv.getY(i));
    });
    const [lower, upper] = [6 / 240, 234 / 240];
    expect(Math.min(...(heights[0] ?? []))).toBeCloseTo(lower, 6);
    expect(Math.max(...(heights[0] ?? []))).toBeCloseTo(upper, 6);
    for (const v of heights[1] ?? []) expect(v).toBeCloseTo(upper, 6);
    for (const v of heights[3] ?? []) expect(v).toBeCloseTo(lower, 6);
  });

  it('runs its staves to the right as seen from outside, from the seam in front', () => {
    const [outside] = faces;
    const uv = outside?.getAttribute('uv');
    const at = points(outside as BufferGeometry);
    expect(at[0]?.z).toBeCloseTo(112, 4);
    const soon = at.findIndex((_, i) => (uv?.getX(i) ?? 0) > 0.1);
    expect(at[soon]?.x).toBeGreaterThan(0);
  });
});
