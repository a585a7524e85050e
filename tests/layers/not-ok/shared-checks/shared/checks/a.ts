import type { x } from '../api/b';

export type X = typeof x;
