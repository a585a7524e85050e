import type { x } from '../frame/b';

export type X = typeof x;
