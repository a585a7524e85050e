import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import type { Grid } from '@shared/layout/cells';
import { beforeEach, describe, expect, it } from 'vitest';
import { LayoutStore } from '../layout-store';
import { PatternTool } from './pattern-tool';

const wood = (name: string) => ({ key: name, name, colour: '#DCC39A', sawn: 'flat' as const });

describe('what the next touch lays', () => {
  const grid = signal<Grid>({ staves: 32, courses: 9 });
  const woods = signal([wood('White ash'), wood('Black walnut'), wood('Sapele')]);
  const cells = signal(new Uint8Array(32 * 9));
  let tool: PatternTool;

  beforeEach(() => {
    grid.set({ staves: 32, courses: 9 });
    woods.set([wood('White ash'), wood('Black walnut'), wood('Sapele')]);
    TestBed.configureTestingModule({
      providers: [PatternTool, { provide: LayoutStore, useValue: { grid, woods, cells } }],
    });
    tool = TestBed.inject(PatternTool);
  });

  it('begins with the second wood on one tile, once', () => {
    expect(tool.woodName()).toBe('black walnut');
    expect([...tool.positionsFor([{ stave: 3, course: 0 }])]).toEqual([3]);
  });

  it('takes another wood into the hand when the one in it is taken out', () => {
    tool.wood.set(2);
    woods.set([wood('White ash'), wood('Black walnut')]);
    expect(tool.woodName()).toBe('black walnut');
  });

  it('repeats round the shell, and no longer when the count does not divide the staves', () => {
    tool.repeat(8);
    expect(tool.positionsFor([{ stave: 3, course: 0 }]).size).toBe(8);
    grid.set({ staves: 28, courses: 9 });
    expect(tool.times()).toBe(1);
    grid.set({ staves: 24, courses: 9 });
    expect(tool.times()).toBe(8);
  });

  it('joins what several tiles of a stroke touch', () => {
    tool.extent.set('stave');
    const met = [
      { stave: 31, course: 2 },
      { stave: 31, course: 3 },
      { stave: 32, course: 3 },
    ];
    expect(tool.positionsFor(met).size).toBe(18);
  });
});
