/**
 * Decoding a picture takes memory and processor time out of all proportion to its size in the request. So a
 * process decodes one at a time, holds few in waiting, and fewer of any one person; whoever comes on top of
 * that is asked to come again.
 */
import { ApiError } from '../http/errors';

export const PLACES = { person: 2, process: 8 } as const;

export interface DecodingPlaces {
  /** Takes a place until it is given back. Throws `too-many-requests` when there is none. */
  readonly take: (personId: string) => { readonly giveBack: () => void };
  /** Runs this after everything that was asked for before it. */
  readonly inTurn: <T>(work: () => Promise<T>) => Promise<T>;
}

export function decodingPlaces(): DecodingPlaces {
  const taken = new Map<string, number>();
  const takenBy = (personId: string) => taken.get(personId) ?? 0;
  let all = 0;
  let last: Promise<unknown> = Promise.resolve();
  return {
    take: (personId) => {
      if (takenBy(personId) >= PLACES.person || all >= PLACES.process) throw noPlace();
      taken.set(personId, takenBy(personId) + 1);
      all++;
      return {
        giveBack: once(() => {
          const left = takenBy(personId) - 1;
          if (left > 0) taken.set(personId, left);
          else taken.delete(personId);
          all--;
        }),
      };
    },
    inTurn: (work) => {
      const turn = last.then(work, work);
      last = turn.catch(() => undefined);
      return turn;
    },
  };
}

function noPlace(): ApiError {
  return new ApiError(
    'too-many-requests',
    'Other pictures are still being read. Wait a few seconds and send this one again.',
  );
}

function once(act: () => void): () => void {
  let done = false;
  return () => {
    if (!done) act();
    done = true;
  };
}
