import type { x } from '../server/b';

export type X = typeof x;
