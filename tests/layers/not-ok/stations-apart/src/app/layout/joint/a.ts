import type { x } from '../shell/b';

export type X = typeof x;
