import express from 'express';
import request from 'supertest';
import { expect, it } from 'vitest';
import { createLogger, requestLog } from './request-log';

it('a log line names the request and keeps cookies, tokens and authorization out', async () => {
  const lines: string[] = [];
  const logger = createLogger('info', { write: (line) => lines.push(line) });
  const app = express().use(requestLog(logger));
  app.get('/here', (_request, response) => {
    response.cookie('staveloom.sid', 'secret-of-answer').send('ok');
  });
  const answer = await request(app)
    .get('/here?lane=quarry')
    .set('Cookie', 'staveloom.sid=secret-of-request')
    .set('Authorization', 'Bearer secret-bearer')
    .set('X-XSRF-TOKEN', 'secret-token');
  expect(lines).toHaveLength(1);
  expect(JSON.parse(lines[0] ?? '')).toMatchObject({
    level: 30,
    req: { id: answer.get('X-Request-Id'), method: 'GET', url: '/here?lane=quarry' },
    res: { statusCode: 200 },
  });
  expect(lines[0]).not.toContain('secret');
});
