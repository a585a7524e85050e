/** Lays starting patterns away from the page: an even scatter of a large shell takes a second. */
import { layStartingPattern } from '@shared/layout/starting-patterns/lay-pattern';
import type { LaidPattern } from '@shared/layout/starting-patterns/starting-pattern';
import type { PatternWish } from './pattern-laying';

addEventListener('message', ({ data: { pattern, grid } }: MessageEvent<PatternWish>) => {
  const laid: LaidPattern = layStartingPattern(pattern, grid);
  postMessage(laid);
});
