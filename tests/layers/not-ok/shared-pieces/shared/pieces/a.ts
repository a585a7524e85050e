import type { x } from '../checks/b';

export type X = typeof x;
