import type * as p0 from '../geometry/outline';

export type Uses = typeof p0;
