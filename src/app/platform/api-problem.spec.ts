import { HttpErrorResponse } from '@angular/common/http';
import { describe, expect, it } from 'vitest';
import { ApiFailure, apiFailureOf } from './api-problem';

const answered = (status: number, error: unknown) =>
  apiFailureOf(new HttpErrorResponse({ status, error }));

describe('a request that failed', () => {
  it('says what the server says, with the fields', () => {
    const failure = answered(400, {
      code: 'bad-input',
      message: 'The title is missing.',
      fields: [{ field: 'title', message: 'must not be empty' }],
      requestId: 'r-1',
    });
    expect(failure.message).toBe('The title is missing.');
    expect(failure.fields).toEqual([{ field: 'title', message: 'must not be empty' }]);
  });

  it('keeps the rest of the answer, such as what a conflict is about', () => {
    const conflict = { revision: 4, others: [] };
    const body = { code: 'conflict', message: 'Changed meanwhile.', requestId: 'r-2', conflict };
    expect(answered(409, body).body).toEqual(body);
  });

  it('no answer at all is a sentence about the connection', () => {
    const failure = answered(0, new ProgressEvent('error'));
    expect(failure.code).toBe('unavailable');
    expect(failure.message).toContain('does not answer');
  });

  it('a proxy without its server counts as no answer', () => {
    expect(answered(502, '<html>Bad gateway</html>').code).toBe('unavailable');
  });

  it('a refused download is read although it came as text', () => {
    const text = JSON.stringify({ code: 'stopped', message: 'A check says stop.', requestId: 'r' });
    expect(answered(409, text).code).toBe('stopped');
  });

  it('an answer that is not ours is told apart by its status', () => {
    expect(answered(413, '<html>').code).toBe('too-large');
    expect(answered(500, null).code).toBe('failed');
  });

  it('a failure stays itself and a stranger becomes a failure', () => {
    const failure = new ApiFailure(404, 'not-found', 'There is no such layout.');
    expect(apiFailureOf(failure)).toBe(failure);
    expect(apiFailureOf(new TypeError('x')).code).toBe('failed');
  });
});
