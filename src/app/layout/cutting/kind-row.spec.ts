import { TestBed } from '@angular/core/testing';
import type { Layout } from '@shared/layout/schema';
import { smallLayout } from '@shared/layout/small-layout.fixture';
import { cutList } from '@shared/pieces/cut-list';
import { describe, expect, it } from 'vitest';
import { KindRow } from './kind-row';

async function rowOf(layout: Layout, number: number, medium: 'paper' | 'screen' = 'screen') {
  const row = cutList(layout).rows.find(({ kind }) => kind.number === number)!;
  const fixture = TestBed.createComponent(KindRow);
  fixture.componentRef.setInput('layout', layout);
  fixture.componentRef.setInput('row', row);
  fixture.componentRef.setInput('reach', 25);
  fixture.componentRef.setInput('medium', medium);
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  const said = () => element.textContent.replace(/\s+/g, ' ');
  const open = async () => {
    element.querySelector('button')!.click();
    await fixture.whenStable();
  };
  return { said, open, element };
}

describe('a line of the cut list', () => {
  it('says kind, wood, edges, count, spares and size', async () => {
    const { said } = await rowOf(smallLayout(), 1);
    expect(said()).toContain('1 · White ash');
    expect(said()).toContain('tabs left and right, flat end');
    expect(said()).toContain('8 + 1 spare');
    expect(said()).toMatch(/\d+\.\d\d × \d+\.\d\d mm/);
  });

  it('speaks inches to a reader of inches', async () => {
    const { said } = await rowOf({ ...smallLayout(), lengthUnit: 'in' }, 1);
    expect(said()).toMatch(/\d\.\d{3} × \d\.\d{3} in/);
    expect(said()).toMatch(/\d\.\d ft/);
  });

  it('draws the outline with arcs', async () => {
    const { element } = await rowOf(smallLayout(), 1);
    expect(element.querySelector('.edge')?.getAttribute('d')).toMatch(/A3\.54 3\.54/);
  });

  it('shows its tiles when opened, as runs, and says how they go in', async () => {
    const { said, open } = await rowOf(smallLayout(), 1);
    expect(said()).not.toContain('half a turn');
    await open();
    expect(said()).toContain('Course A1, 3, 5, 7');
    expect(said()).toContain('4 go in after half a turn of the drawing.');
  });

  it('says which courses lie face down', async () => {
    const { said, open } = await rowOf(smallLayout(), 3);
    await open();
    expect(said()).toContain('lie face down when cut: course B.');
  });

  it('always shows its tiles on paper', async () => {
    const { said } = await rowOf(smallLayout(), 1, 'paper');
    expect(said()).toContain('Course A');
  });
});
