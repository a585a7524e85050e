/** Which woods a picture is laid in, and how much of each. */
import type { Wood } from '@shared/layout/schema';
import type { WishedWood } from '@shared/wood/picture';

/** What is wished of a wood: steps of its share, each doubling its odds; null leaves it out. */
export type ShareSteps = number | null;

/** Wishes by the key of the wood; a wood without one takes part as it is. */
export type WoodWishes = ReadonlyMap<string, ShareSteps>;

export const STEPS_MOST = 3;

export function stepsOf(wishes: WoodWishes, key: string): ShareSteps {
  const steps = wishes.get(key);
  return steps === undefined ? 0 : steps;
}

/** The woods that take part, with their weights. */
export function wishedWoods(woods: readonly Wood[], wishes: WoodWishes): WishedWood[] {
  return woods.flatMap(({ key, colour }, wood) => {
    const steps = stepsOf(wishes, key);
    return steps === null ? [] : [{ wood, colour, weight: 2 ** steps }];
  });
}

/** "as in the picture", "2 times as much", "half as much". */
export function shareWords(steps: number): string {
  if (steps === 0) return 'as in the picture';
  const times = 2 ** Math.abs(steps);
  const figure = Number(times.toFixed(1));
  if (steps > 0) return `${figure} times as much`;
  return times === 2 ? 'half as much' : `${figure} times less`;
}

/** Shares in whole per cent: "52 %", and "under 1 %" for what is there but rounds to nothing. */
export function percentWords(count: number, of: number): string {
  const percent = (100 * count) / Math.max(1, of);
  if (count > 0 && percent < 1) return 'under 1 %';
  return `${Math.round(percent)} %`;
}
