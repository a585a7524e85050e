import { provideHttpClient, withInterceptors } from '@angular/common/http';
import {
  HttpTestingController,
  provideHttpClientTesting,
  type TestRequest,
} from '@angular/common/http/testing';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { may, type Right } from '@shared/api/rights';
import type { Commission } from '@shared/api/commission';
import type { Role } from '@shared/api/session';
import { beforeEach, describe, expect, it } from 'vitest';
import { apiErrors } from '../platform/api-errors';
import { SessionStore } from '../platform/session-store';
import { commissionWith } from './commission.fixture';
import { CommissionsPage } from './commissions-page';

describe('the commissions page', () => {
  let fixture: ComponentFixture<CommissionsPage>;
  let http: HttpTestingController;
  let roles: Role[];
  const page = () => fixture.nativeElement as HTMLElement;
  const titles = () => [...page().querySelectorAll('td a')].map((link) => link.textContent);
  const chip = (name: string) =>
    [...page().querySelectorAll<HTMLButtonElement>('.chips button')].find((button) =>
      button.textContent.includes(name),
    )!;
  const list = (archived: string): TestRequest =>
    http.expectOne(`/api/commissions?archived=${archived}`);

  async function open(current: Commission[], archived: Commission[] = []): Promise<void> {
    fixture = TestBed.createComponent(CommissionsPage);
    list('false').flush({ commissions: current });
    list('true').flush({ commissions: archived });
    await fixture.whenStable();
  }

  beforeEach(() => {
    roles = ['designer'];
    TestBed.configureTestingModule({
      providers: [
        provideRouter([{ path: '**', children: [] }]),
        provideHttpClient(withInterceptors([apiErrors])),
        provideHttpClientTesting(),
        { provide: SessionStore, useValue: { may: (right: Right) => may(roles, right) } },
      ],
    });
    http = TestBed.inject(HttpTestingController);
  });

  it('opens on what is open, the next due first, and counts the rest', async () => {
    await open(
      [
        commissionWith({ id: '1', title: 'Later', due: '2027-05-01', woods: ['Wenge'] }),
        commissionWith({ id: '2', title: 'Sooner', due: '2027-04-01', stage: 'cutting' }),
        commissionWith({ id: '3', title: 'Gone', stage: 'delivered' }),
      ],
      [commissionWith({ id: '4', title: 'Put away', archived: true })],
    );
    expect(titles()).toEqual(['Sooner', 'Later']);
    expect(chip('Archived').textContent.trim()).toBe('Archived 1');
    chip('Delivered').click();
    await fixture.whenStable();
    expect(titles()).toEqual(['Gone']);
  });

  it('finds by a wood’s name and says so when nothing is found', async () => {
    await open([
      commissionWith({ id: '1', title: 'Planter', woods: ['Wenge'] }),
      commissionWith({ id: '2', title: 'Lantern' }),
    ]);
    const box = page().querySelector<HTMLInputElement>('input[type=search]')!;
    box.value = 'weng';
    box.dispatchEvent(new Event('input'));
    await fixture.whenStable();
    expect(titles()).toEqual(['Planter']);
    box.value = 'zebrano';
    box.dispatchEvent(new Event('input'));
    await fixture.whenStable();
    expect(page().textContent).toContain('Nothing to show here');
  });

  it('offers the first step when there is no commission at all', async () => {
    await open([]);
    expect(page().querySelector('sl-empty-place button')?.textContent).toContain(
      'Start the first commission',
    );
  });

  it('lets a maker look but not begin or move a commission', async () => {
    roles = ['maker'];
    await open([commissionWith()]);
    expect(page().textContent).not.toContain('New commission');
    expect(page().querySelector('.stage')).toBeNull();
    expect(titles()).toEqual(['Ferry-hall lantern']);
  });

  it('says when the list could not be fetched and fetches it again', async () => {
    fixture = TestBed.createComponent(CommissionsPage);
    list('true');
    list('false').error(new ProgressEvent('error'));
    await fixture.whenStable();
    expect(page().textContent).toContain('The commissions could not be fetched');
    page().querySelector<HTMLButtonElement>('sl-trouble button')!.click();
    list('false').flush({ commissions: [commissionWith()] });
    list('true').flush({ commissions: [] });
    await fixture.whenStable();
    expect(titles()).toEqual(['Ferry-hall lantern']);
  });
});
