import type { Thumbnail } from '@shared/api/commission';

/** All tiles of one colour as one SVG path; one unit a tile, course A at the bottom (y grows downwards). */
export interface ColourRuns {
  readonly colour: string;
  readonly path: string;
}

/**
 * Neighbours of one colour in a course become one rectangle, so that the picture stays small and has
 * no hairlines between tiles. A tile whose colour or byte is missing is left out.
 */
export function colourRuns(thumbnail: Thumbnail): readonly ColourRuns[] {
  const { staves, courses, colours } = thumbnail;
  const cells = bytesOf(thumbnail.cells);
  const paths = colours.map(() => '');
  for (let course = 0; course < courses; course++) {
    const top = courses - 1 - course;
    let stave = 0;
    while (stave < staves) {
      const index = cells.charCodeAt(course * staves + stave);
      let end = stave + 1;
      while (end < staves && cells.charCodeAt(course * staves + end) === index) end++;
      if (paths[index] !== undefined) paths[index] += `M${stave} ${top}h${end - stave}v1H${stave}z`;
      stave = end;
    }
  }
  return colours.flatMap((colour, index) => {
    const path = paths[index] ?? '';
    return path === '' ? [] : [{ colour, path }];
  });
}

function bytesOf(base64: string): string {
  try {
    return atob(base64);
  } catch {
    return '';
  }
}
