import { compareLayouts } from '@shared/layout/comparison';
import type { Layout } from '@shared/layout/schema';
import { smallLayout } from '@shared/layout/small-layout.fixture';
import { describe, expect, it } from 'vitest';
import { comparisonWords } from './comparison-words';

const before = smallLayout();

function wordsOf(after: Layout, unit: 'mm' | 'in' = 'mm') {
  return comparisonWords(compareLayouts(before, after), before, after, unit);
}

function withTiles(...laid: readonly (readonly [position: number, wood: number])[]): Layout {
  const cells = before.cells.slice();
  for (const [position, wood] of laid) cells[position] = wood;
  return { ...before, cells };
}

describe('what changed between two versions', () => {
  it('is nothing between a version and itself', () => {
    expect(wordsOf(before)).toEqual({ summary: 'nothing', figures: [], woods: [], tiles: [] });
  });

  it('tells lengths in the unit of the reader', () => {
    const after = { ...before, shell: { ...before.shell, boardThickness: 25.4 } };
    const figure = { subject: 'Board', kind: 'text' };
    expect(wordsOf(after).figures).toEqual([{ ...figure, before: '20.00 mm', after: '25.40 mm' }]);
    expect(wordsOf(after, 'in').figures).toEqual([
      { ...figure, before: '0.787 in', after: '1.000 in' },
    ]);
  });

  it('shows more decimals where two lengths would read alike', () => {
    const after = { ...before, joint: { ...before.joint, clearance: 0.121 } };
    expect(wordsOf(after).figures).toEqual([
      {
        subject: 'Clearance between mating edges',
        kind: 'text',
        before: '0.12 mm',
        after: '0.121 mm',
      },
    ]);
  });

  it('names each figure of a joint that changed', () => {
    const staveJoint = { ...before.joint.staveJoint, reach: 8 };
    const after = { ...before, joint: { ...before.joint, staveJoint } };
    expect(wordsOf(after).figures).toEqual([
      { subject: 'Stave joint, tab reach', kind: 'text', before: '7.60 mm', after: '8.00 mm' },
    ]);
  });

  it('says what a new profile has that the old one had not', () => {
    const courseJoint = {
      profile: 'dovetail',
      rootWidth: 7,
      flankAngle: 10,
      reach: 7.6,
      tipRadius: 1.8,
      rootRadius: 1.8,
    } as const;
    const after: Layout = { ...before, joint: { ...before.joint, courseJoint } };
    const rows = wordsOf(after).figures.map((f) => `${f.subject}: ${f.before} > ${f.after}`);
    expect(rows).toContain('Course joint, profile: round > dovetail');
    expect(rows).toContain('Course joint, head radius: 3.60 mm > none');
    expect(rows).toContain('Course joint, flank angle: none > 10.00°');
    expect(rows.some((row) => row.includes('reach'))).toBe(false);
  });

  it('counts changed tiles by what they were and became', () => {
    const words = wordsOf(withTiles([0, 1], [3, 1], [5, 2]));
    expect(words.summary).toBe('3 tiles');
    expect(words.tiles).toEqual([
      '2 tiles from White ash to Black walnut.',
      '1 tile from White ash to Sapele.',
    ]);
  });

  it('names woods that came, went and changed', () => {
    const [ash, walnut, sapele] = before.woods;
    const padauk = { key: 'padauk', name: 'Padauk', colour: '#A03A20', sawn: 'flat' } as const;
    const after: Layout = {
      ...before,
      woods: [{ ...ash!, colour: '#E0C8A0' }, walnut!, sapele!, padauk],
    };
    const words = wordsOf(after);
    expect(words.woods).toEqual(['Padauk came in.', 'Beech was taken out.']);
    expect(words.figures).toEqual([
      { subject: 'White ash, colour', kind: 'colour', before: '#DCC39A', after: '#E0C8A0' },
    ]);
    expect(words.summary).toBe('1 figure and 2 woods');
  });

  it('tells another size by its staves and courses', () => {
    const after: Layout = {
      ...before,
      shell: { ...before.shell, staves: 10 },
      cells: new Uint8Array(30),
    };
    expect(wordsOf(after).figures).toEqual([
      { subject: 'Staves round', kind: 'text', before: '8', after: '10' },
    ]);
  });

  it('tells ways of building and spares in words', () => {
    const build = {
      way: 'tile-by-tile',
      turnOver: false,
      spareShare: 0.125,
      spareMinimum: 2,
    } as const;
    const rows = wordsOf({ ...before, build }).figures.map((f) => `${f.before} > ${f.after}`);
    expect(rows).toEqual(['stave by stave > tile by tile', 'yes > no', '10 % > 12.5 %', '1 > 2']);
  });
});
