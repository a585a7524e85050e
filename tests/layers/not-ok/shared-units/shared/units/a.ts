import type { x } from '../geometry/b';

export type X = typeof x;
