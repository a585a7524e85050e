import type { x } from '../pieces/b';

export type X = typeof x;
