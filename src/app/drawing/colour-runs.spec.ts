import { describe, expect, it } from 'vitest';
import { colourRuns } from './colour-runs';

const cells = (...indexes: number[]) => btoa(String.fromCharCode(...indexes));

describe('a thumbnail as paths', () => {
  it('neighbours of one colour are one rectangle and course A lies at the bottom', () => {
    const runs = colourRuns({
      staves: 3,
      courses: 2,
      colours: ['#111111', '#222222'],
      cells: cells(0, 0, 1, 1, 1, 1),
    });
    expect(runs).toEqual([
      { colour: '#111111', path: 'M0 1h2v1H0z' },
      { colour: '#222222', path: 'M2 1h1v1H2zM0 0h3v1H0z' },
    ]);
  });

  it('a colour that is not laid draws nothing', () => {
    const runs = colourRuns({
      staves: 1,
      courses: 1,
      colours: ['#111111', '#222222'],
      cells: cells(1),
    });
    expect(runs.map((run) => run.colour)).toEqual(['#222222']);
  });

  it('a broken picture draws nothing instead of failing', () => {
    expect(colourRuns({ staves: 2, courses: 1, colours: ['#111111'], cells: '%%%' })).toEqual([]);
  });
});
