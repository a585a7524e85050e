import { expect, it } from 'vitest';
import type { Outline } from '@shared/geometry/outline';
import { pieceSvg } from './piece-svg';

/** Half a disc of radius 2 above the x axis. */
const halfDisc: Outline = {
  segments: [
    { kind: 'line', from: { x: -2, y: 0 }, to: { x: 2, y: 0 } },
    { kind: 'arc', centre: { x: 0, y: 0 }, radius: 2, startAngle: 0, sweep: Math.PI },
  ],
};

it('a piece is a file as large as itself, y running down, its name escaped', () => {
  expect(pieceSvg({ outline: halfDisc, title: '01 Ash & <oak>', colour: '#DCC39A' })).toBe(
    [
      '<?xml version="1.0" encoding="UTF-8"?>',
      '<svg xmlns="http://www.w3.org/2000/svg" width="4mm" height="2mm" viewBox="-2 -2 4 2">' +
        '<title>01 Ash &amp; &lt;oak&gt;</title>' +
        '<path fill="#DCC39A" d="M-2 0L2 0A2 2 0 0 0 -2 0Z"/></svg>',
      '',
    ].join('\n'),
  );
});
