import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import type { CopiedPatch } from '@shared/layout/copied-patch';
import { applyPatch, type Change } from '@shared/layout/patch';
import type { Layout } from '@shared/layout/schema';
import { smallLayout } from '@shared/layout/small-layout.fixture';
import { beforeEach, describe, expect, it } from 'vitest';
import { Announcer } from '../../platform/announcer';
import { LayoutStore } from '../layout-store';
import { CopiedPatches } from './copied-patches';
import { PatternHand } from './pattern-hand';
import { PatternTool } from './pattern-tool';

/** A store that applies gestures and counts them as steps. */
class OpenLayoutDesk {
  readonly layout = signal<Layout>(smallLayout());
  readonly steps: Layout[] = [];
  cells = () => this.layout().cells;
  woods = () => this.layout().woods;
  grid = () => ({ staves: 8, courses: 3 });

  begin() {
    const before = this.layout();
    return {
      apply: (...changes: (Change | null)[]) =>
        this.layout.update((layout) =>
          applyPatch(
            layout,
            changes.filter((change) => change !== null),
          ),
        ),
      finish: () => this.steps.push(before),
      cancel: () => this.layout.set(before),
    };
  }
}

describe('the hand over the pattern', () => {
  let desk: OpenLayoutDesk;
  let hand: PatternHand;
  let tool: PatternTool;
  const spoken: string[] = [];
  const at = (stave: number, course: number) => ({ stave, course });
  const laid = () => [...desk.cells().entries()].flatMap(([p, wood]) => (wood === 1 ? [p] : []));

  beforeEach(() => {
    localStorage.clear();
    spoken.length = 0;
    desk = new OpenLayoutDesk();
    const say = (sentence: string) => spoken.push(sentence);
    TestBed.configureTestingModule({
      providers: [
        PatternHand,
        PatternTool,
        CopiedPatches,
        { provide: LayoutStore, useValue: desk },
        { provide: Announcer, useValue: { speak: say, tell: say } },
      ],
    });
    hand = TestBed.inject(PatternHand);
    tool = TestBed.inject(PatternTool);
  });

  it('draws a patch out over the seam as one step, and only where it lets go', () => {
    tool.extent.set('patch');
    hand.begin();
    hand.meet([at(7, 0)]);
    hand.meet([at(8, 1), at(10, 2)]);
    expect(laid()).toHaveLength(12);
    hand.meet([at(8, 1)]);
    hand.end();
    expect(laid()).toEqual([0, 7, 8, 15]);
    expect(desk.steps).toHaveLength(1);
  });

  it('takes a patch back with Escape', () => {
    tool.extent.set('patch');
    hand.begin();
    hand.meet([at(1, 0), at(3, 2)]);
    hand.cancel();
    expect(laid()).toEqual([]);
    expect(desk.steps).toHaveLength(0);
  });

  it('means connected tiles by the first tile of a stroke alone', () => {
    tool.extent.set('stave');
    hand.begin();
    hand.meet([at(0, 0)]);
    hand.meet([at(4, 0)]);
    hand.end();
    tool.extent.set('connected');
    tool.wood.set(2);
    hand.begin();
    hand.meet([at(1, 1)]);
    hand.meet([at(4, 1), at(5, 1)]);
    hand.end();
    const woods = [0, 1, 3, 4, 5, 7].map((stave) => desk.cells()[stave]);
    expect(woods).toEqual([1, 2, 2, 1, 0, 0]);
  });

  it('says how many tiles will change before anything is touched', () => {
    expect(hand.words()).toBeNull();
    tool.repeat(4);
    hand.point(at(0, 0));
    expect(hand.words()).toBe('4 tiles will change.');
    expect(hand.reached()).toEqual([0, 2, 4, 6]);
    tool.wood.set(0);
    expect(hand.words()).toBe('Nothing changes: 4 tiles already so.');
  });

  it('draws a patch out over the seam with the keyboard', () => {
    hand.walk(at(7, 1));
    hand.mark(at(7, 1));
    hand.walk(at(0, 1));
    hand.walk(at(1, 1));
    expect(hand.words()).toBe('3 tiles will change.');
    hand.touch(at(1, 1));
    expect(laid()).toEqual([8, 9, 15]);
    expect(spoken.at(-1)).toBe('Laid black walnut on 3 tiles from B 2.');
  });

  it('copies what was dragged out, and lays it again where it is put', () => {
    hand.walk(at(0, 0));
    hand.touch(at(0, 0));
    hand.walk(null);
    tool.take('copy');
    hand.begin();
    hand.meet([at(0, 0)]);
    expect(hand.words()).toBe('1 tile will be copied.');
    hand.meet([at(1, 1)]);
    hand.end();
    expect(tool.verb()).toBe('lay-copy');
    hand.begin();
    hand.meet([at(4, 0)]);
    hand.meet([at(4, 1)]);
    hand.end();
    expect(laid()).toEqual([0, 12]);
    expect(desk.steps).toHaveLength(2);
  });

  it('adds a wood that only the copy has, in the same step', () => {
    const copied: CopiedPatch = {
      staves: 1,
      courses: 1,
      woods: [{ key: 'purpleheart', name: 'Purpleheart', colour: '#7A2E63', sawn: 'flat' }],
      cells: Uint8Array.of(0),
    };
    hand.walk(at(2, 2));
    hand.paste(copied);
    expect(desk.woods().at(-1)?.key).toBe('purpleheart');
    expect(desk.cells()[18]).toBe(4);
    expect(desk.steps).toHaveLength(1);
  });
});
