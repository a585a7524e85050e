import { Component, signal } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import type { LengthUnit } from '@shared/units/length';
import { beforeEach, describe, expect, it } from 'vitest';
import { LengthField } from './length-field';

@Component({
  imports: [LengthField],
  template: `
    <sl-length-field
      label="Tile width"
      [lengthUnit]="unit()"
      [value]="width()"
      [least]="6"
      [most]="300"
      [problem]="problem()"
      (changed)="heard.push($event); width.set($event)"
    />
  `,
})
class Bench {
  readonly unit = signal<LengthUnit>('mm');
  readonly width = signal(28);
  readonly problem = signal<string | null>(null);
  readonly heard: number[] = [];
}

describe('a length field', () => {
  let fixture: ComponentFixture<Bench>;
  const input = () => (fixture.nativeElement as HTMLElement).querySelector('input')!;
  const error = () =>
    (fixture.nativeElement as HTMLElement).querySelector('mat-error')?.textContent.trim();

  async function type(text: string): Promise<void> {
    input().value = text;
    input().dispatchEvent(new Event('input'));
    await fixture.whenStable();
  }

  beforeEach(async () => {
    fixture = TestBed.createComponent(Bench);
    await fixture.whenStable();
  });

  it('shows the length in the reader’s unit and follows a change of unit', async () => {
    expect(input().value).toBe('28.00');
    fixture.componentInstance.unit.set('in');
    await fixture.whenStable();
    expect(input().value).toBe('1.102');
  });

  it('looking at inches and leaving the field changes nothing', async () => {
    fixture.componentInstance.unit.set('in');
    await fixture.whenStable();
    input().dispatchEvent(new Event('blur'));
    await fixture.whenStable();
    expect(fixture.componentInstance.heard).toEqual([]);
    expect(fixture.componentInstance.width()).toBe(28);
  });

  it('passes on what is typed, in millimetres', async () => {
    fixture.componentInstance.unit.set('in');
    await fixture.whenStable();
    await type('1 1/8');
    expect(fixture.componentInstance.heard[0]).toBeCloseTo(28.575, 9);
    expect(input().value).toBe('1 1/8');
    input().dispatchEvent(new Event('blur'));
    expect(input().value).toBe('1.125');
  });

  it('a length out of bounds is said and not passed on', async () => {
    await type('2');
    expect(error()).toBe('Must be at least 6.00 mm.');
    expect(fixture.componentInstance.heard).toEqual([]);
  });

  it('words are said to be no length and stay to be mended', async () => {
    await type('wide');
    input().dispatchEvent(new Event('blur'));
    await fixture.whenStable();
    expect(error()).toContain('“wide” is not a length');
    expect(input().value).toBe('wide');
  });

  it('a problem found elsewhere marks the field', async () => {
    fixture.componentInstance.problem.set('The joint does not close.');
    await fixture.whenStable();
    expect(error()).toBe('The joint does not close.');
  });
});
