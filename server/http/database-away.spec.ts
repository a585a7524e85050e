import { describe, expect, it } from 'vitest';
import { databaseIsAway } from './database-away';

const coded = (code: string) => Object.assign(new Error('refused'), { code });

describe('telling a database that is away from one that refuses a query', () => {
  it.each([
    ['nobody listens', coded('ECONNREFUSED')],
    ['it is shutting down', coded('57P01')],
    ['it is still starting', coded('57P03')],
    ['no connection in time', new Error('timeout exceeded when trying to connect')],
    ['the connection broke', new Error('Connection terminated unexpectedly')],
    ['wrapped by the query builder', new Error('Failed query', { cause: coded('ECONNREFUSED') })],
    ['all addresses refused', new AggregateError([coded('ECONNREFUSED')], 'refused')],
  ])('away: %s', (_, error) => {
    expect(databaseIsAway(error)).toBe(true);
  });

  it.each([
    ['a broken rule', coded('23505')],
    ['a query with a mistake', new Error('Failed query', { cause: coded('42601') })],
    ['our own mistake', new TypeError('undefined is not a function')],
    ['no error at all', 'ECONNREFUSED'],
  ])('not away: %s', (_, error) => {
    expect(databaseIsAway(error)).toBe(false);
  });
});
