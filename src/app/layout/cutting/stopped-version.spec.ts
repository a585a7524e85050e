import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { runChecks } from '@shared/checks/run-checks';
import { smallLayout } from '@shared/layout/small-layout.fixture';
import { beforeEach, describe, expect, it } from 'vitest';
import { StoppedVersion } from './stopped-version';

const STOPS = runChecks({ ...smallLayout(), cutter: { diameter: 6, fluteLength: 25 } }).filter(
  ({ result }) => result === 'stop',
);

describe('a version that is stopped', () => {
  let fixture: ComponentFixture<StoppedVersion>;
  let reasons: string[];
  const element = () => fixture.nativeElement as HTMLElement;
  const button = (text: string) =>
    [...element().querySelectorAll('button')].find(({ textContent }) => textContent.includes(text));

  async function write(reason: string): Promise<void> {
    const field = element().querySelector('textarea')!;
    field.value = reason;
    field.dispatchEvent(new Event('input'));
    element().querySelector('form')!.dispatchEvent(new Event('submit'));
    await fixture.whenStable();
  }

  beforeEach(async () => {
    fixture = TestBed.createComponent(StoppedVersion);
    fixture.componentRef.setInput('number', 3);
    fixture.componentRef.setInput('stops', STOPS);
    reasons = [];
    fixture.componentInstance.goOn.subscribe((reason) => reasons.push(reason));
    await fixture.whenStable();
  });

  it('says every reason with what to change', () => {
    expect(STOPS.length).toBeGreaterThan(0);
    for (const { finding, remedy } of STOPS) {
      const said = element().textContent.replace(/\s+/g, ' ');
      expect(said).toContain(finding);
      expect(said).toContain(remedy);
    }
  });

  it('goes on with a reason in writing, and not without one', async () => {
    button('Go on in writing')?.click();
    await fixture.whenStable();
    await write('  ');
    expect(reasons).toEqual([]);
    expect(element().textContent).toContain('must say why');
    await write('  Cut with a 2.4 mm laser kerf instead. ');
    expect(reasons).toEqual(['Cut with a 2.4 mm laser kerf instead.']);
  });

  it('tells everyone else who may go on', async () => {
    fixture.componentRef.setInput('mayGoOn', 'ask');
    await fixture.whenStable();
    expect(element().textContent).toContain('ask a maker or owner');
    expect(button('Go on in writing')).toBeUndefined();
  });
});
