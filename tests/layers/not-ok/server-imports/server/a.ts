import type { x } from '../seeds/b';

export type X = typeof x;
