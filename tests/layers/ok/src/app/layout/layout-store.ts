import type * as p0 from '../platform/guards';

export type Uses = typeof p0;
