import type * as p0 from 'node:fs';
import type * as p1 from './svg/print';

export type Uses = typeof p0 | typeof p1;
