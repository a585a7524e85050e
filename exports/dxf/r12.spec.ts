import { expect, it } from 'vitest';
import { printR12 } from './r12';

/** The groups of a file, "code value" a line, without the lines of the tables. */
function groupsOf(text: string): string[] {
  const lines = text.trimEnd().split('\r\n');
  const groups: string[] = [];
  for (let i = 0; i < lines.length; i += 2) groups.push(`${lines[i]} ${lines[i + 1]}`);
  const tables = groups.indexOf('2 TABLES');
  return [...groups.slice(0, tables), ...groups.slice(groups.indexOf('2 BLOCKS'))];
}

it('half a disc of one inch radius is two vertices, the second with bulge 1', () => {
  const text = printR12({
    unit: 'in',
    layers: ['PART'],
    outlines: [
      {
        layer: 'PART',
        outline: {
          segments: [
            { kind: 'line', from: { x: -25.4, y: 0 }, to: { x: 25.4, y: 0 } },
            { kind: 'arc', centre: { x: 0, y: 0 }, radius: 25.4, startAngle: 0, sweep: Math.PI },
          ],
        },
      },
    ],
    labels: [],
  });
  expect(groupsOf(text)).toEqual([
    '999 Staveloom: coordinates in inches',
    ...['0 SECTION', '2 HEADER', '9 $ACADVER', '1 AC1009', '0 ENDSEC', '0 SECTION'],
    ...['2 BLOCKS', '0 ENDSEC', '0 SECTION', '2 ENTITIES'],
    ...['0 POLYLINE', '8 PART', '66 1', '10 0', '20 0', '30 0', '70 1'],
    ...['0 VERTEX', '8 PART', '10 -1', '20 0', '30 0'],
    ...['0 VERTEX', '8 PART', '10 1', '20 0', '30 0', '42 1'],
    ...['0 SEQEND', '8 PART', '0 ENDSEC', '0 EOF'],
  ]);
});
