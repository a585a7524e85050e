import type { x } from '../sign-in/b';

export type X = typeof x;
