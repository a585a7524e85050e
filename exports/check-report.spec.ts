import { expect, it } from 'vitest';
import type { CheckResult } from '@shared/checks/check';
import { checkLine } from './check-report';

const check: CheckResult = {
  key: 'flute',
  result: 'stop',
  station: 'joint',
  title: 'Flute length',
  figure: { value: 12, kind: 'length' },
  limit: { value: 14, kind: 'length' },
  finding: 'The flutes are 12.00 mm long and the board 14.00 mm thick.',
  reason: 'A cutter rubs where it has no flutes.',
  remedy: 'Take a cutter with longer flutes.',
};

it('a check is one line, with its remedy when there is something to change', () => {
  expect(checkLine(check)).toBe(
    'stop     flute          The flutes are 12.00 mm long and the board 14.00 mm thick. Take a cutter with longer flutes.',
  );
  expect(checkLine({ ...check, result: 'clear', remedy: '' })).toBe(
    'clear    flute          The flutes are 12.00 mm long and the board 14.00 mm thick.',
  );
});
