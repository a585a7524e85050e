import { expect, it } from 'vitest';
import { startingLayout } from '../layout/starting-layout';
import { summaryOf } from './layout-summary';

it('the summary names the woods by their tiles and leaves out a wood that is not laid', () => {
  const start = startingLayout('Two woods of three');
  const spare = { key: 'cherry', name: 'Cherry', colour: '#A5603B', sawn: 'flat' } as const;
  const cells = start.cells.map((_, position) => (position < 10 ? 0 : 1));
  expect(summaryOf({ ...start, woods: [...start.woods, spare], cells })).toMatchObject({
    staves: 24,
    courses: 8,
    woods: ['Black walnut', 'Hard maple'],
  });
});
