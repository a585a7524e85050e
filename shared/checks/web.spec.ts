import { describe, expect, it } from 'vitest';
import { found } from './one-check.fixture';

/** Opposite sockets leave tile − 2 × reach − clearance: 12.68 mm on a tile of 28. */
const tall = (tileHeight: number) => ({ shell: { tileHeight, finishedHeight: 8 * tileHeight } });

describe('the web between two sockets', () => {
  it('is clear at the least of 2.5 mm and a caution under it', () => {
    expect(found('web', tall(17.82 + 1e-9)).result).toBe('clear');
    expect(found('web', tall(17.81))).toMatchObject({
      result: 'caution',
      finding: 'The thinnest wood between two sockets is 2.49 mm; 2.50 mm is the least.',
    });
    expect(found('web', tall(28), { webMinimum: 13 }).result).toBe('caution');
  });

  it('is a stop when they touch or cross', () => {
    expect(found('web', tall(15.32))).toMatchObject({
      result: 'stop',
      finding: 'Two sockets of a tile run into each other: the tile would fall apart.',
    });
    expect(found('web', tall(14)).result).toBe('stop');
  });

  it('is a stop when a socket goes through the far side of its tile', () => {
    const single = {
      shell: { courses: 1, tileWidth: 12 },
      joint: {
        scheme: 'one-way',
        staveJoint: { profile: 'round', headRadius: 4, filletRadius: 3, reach: 13 },
      },
    } as const;
    expect(found('web', single).finding).toBe(
      'A socket runs into another side of its tile: the tile would fall apart.',
    );
  });
});

describe('the wood beside a socket', () => {
  it('is a caution when the head comes near the next side', () => {
    const wide = {
      staveJoint: { profile: 'round', headRadius: 11.5, filletRadius: 0.5, reach: 13 },
    } as const;
    expect(found('web', { joint: wide, shell: { tileWidth: 60 } })).toMatchObject({
      result: 'caution',
      finding: 'The thinnest wood beside a socket is 2.38 mm; 2.50 mm is the least.',
    });
  });

  it('is not measured at rounded lips, which end near the corner by design', () => {
    const lipped = {
      staveJoint: { profile: 'round', headRadius: 3, filletRadius: 7, reach: 9 },
    } as const;
    expect(found('web', { joint: lipped }).result).toBe('clear');
  });
});

it('a tile without two sockets has no web to measure, but wood beside', () => {
  const single = { shell: { courses: 1 } };
  expect(found('web', single).result).toBe('clear');
});
