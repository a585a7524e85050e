import type { x } from '../drizzle/b';

export type X = typeof x;
