import type { x } from './b.spec';

export type X = typeof x;
