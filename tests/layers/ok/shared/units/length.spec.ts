import type * as p0 from 'vitest';
import type * as p1 from './length';

export type Uses = typeof p0 | typeof p1;
