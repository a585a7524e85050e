import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { runChecks } from '@shared/checks/run-checks';
import { smallLayout } from '@shared/layout/small-layout.fixture';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { apiErrors } from '../../platform/api-errors';
import { BundleDownload, stopsIn, type BundleOrder } from './bundle-download';
import { sentenceAbout } from './bundle-progress';

const ORDER: BundleOrder = {
  layoutId: 'ce8e8bf7',
  version: 7,
  fileName: 'ferry-hall-lantern-v7.zip',
  request: { dxf: 'r12', unit: 'in', centrePath: true },
};
const STOPPED = runChecks({ ...smallLayout(), cutter: { diameter: 6, fluteLength: 10 } });

describe('downloading a bundle', () => {
  let server: HttpTestingController;
  let download: BundleDownload;
  const saved: string[] = [];

  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [
        BundleDownload,
        provideHttpClient(withInterceptors([apiErrors])),
        provideHttpClientTesting(),
      ],
    });
    server = TestBed.inject(HttpTestingController);
    download = TestBed.inject(BundleDownload);
    saved.length = 0;
    URL.createObjectURL = () => 'blob:bundle';
    URL.revokeObjectURL = () => undefined;
    vi.spyOn(HTMLAnchorElement.prototype, 'click').mockImplementation(function (
      this: HTMLAnchorElement,
    ) {
      saved.push(this.download);
    });
  });

  afterEach(() => {
    vi.restoreAllMocks();
    server.verify();
  });

  const request = () => server.expectOne('/api/layouts/ce8e8bf7/versions/7/bundle');

  it('sends what was chosen and saves the file under its name', () => {
    download.start(ORDER);
    const sent = request();
    expect(sent.request.method).toBe('POST');
    expect(sent.request.body).toEqual(ORDER.request);
    expect(sentenceAbout(download.state())).toBe('Version 7 is being drawn…');
    sent.flush(new Blob(['zip']));
    expect(saved).toEqual(['ferry-hall-lantern-v7.zip']);
    expect(sentenceAbout(download.state())).toContain('is in the downloads, 3 bytes.');
  });

  it('keeps the reasons of a stop', async () => {
    download.start(ORDER);
    const body = {
      code: 'stopped',
      message: 'A check says stop.',
      requestId: 'r',
      checks: STOPPED,
    };
    request().flush(new Blob([JSON.stringify(body)]), { status: 409, statusText: 'Conflict' });
    await vi.waitFor(() => expect(download.state().kind).toBe('stopped'));
    const state = download.state();
    const keys = state.kind === 'stopped' ? state.checks.map(({ key }) => key) : [];
    expect(keys).toContain('inside-radius');
    expect(saved).toEqual([]);
  });

  it('says in a sentence why it failed, and can be tried again', async () => {
    download.start(ORDER);
    request().error(new ProgressEvent('error'));
    await vi.waitFor(() => expect(download.state().kind).toBe('failed'));
    expect(sentenceAbout(download.state())).toContain('The bundle could not be made.');
    download.start(ORDER);
    request().flush(new Blob(['zip']));
    expect(download.state().kind).toBe('saved');
  });

  it('gives up what is under way when another is started', () => {
    download.start(ORDER);
    const first = request();
    download.start(ORDER);
    expect(first.cancelled).toBe(true);
    request().flush(new Blob(['zip']));
    expect(saved).toHaveLength(1);
  });
});

describe('the stops in a refusal', () => {
  it('are only the checks that say stop', () => {
    expect(stopsIn({ checks: STOPPED }).every(({ result }) => result === 'stop')).toBe(true);
  });

  it('are none in an answer of another shape', () => {
    for (const body of [null, 'no', {}, { checks: 'none' }, { checks: [{ result: 'stop' }] }]) {
      expect(stopsIn(body)).toEqual([]);
    }
  });
});
