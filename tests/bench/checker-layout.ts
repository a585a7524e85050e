import type { Layout } from '@shared/layout/schema';
import { startingLayout } from '@shared/layout/starting-layout';

/** A checker of two woods in the given size. */
export function checkerLayout(staves: number, courses: number): Layout {
  const start = startingLayout(`${staves} × ${courses}`);
  const cells = Uint8Array.from({ length: staves * courses }, (_, position) => {
    const [stave, course] = [position % staves, Math.floor(position / staves)];
    return (stave + course) % 2;
  });
  return { ...start, shell: { ...start.shell, staves, courses, finishedHeight: 228 }, cells };
}
