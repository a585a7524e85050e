import type * as p0 from '../units/length';

export type Uses = typeof p0;
