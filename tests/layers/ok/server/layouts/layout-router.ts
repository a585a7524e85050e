import type * as p0 from 'express';
import type * as p1 from './layout-store';
import type * as p2 from '../../exports/svg/print';

export type Uses = typeof p0 | typeof p1 | typeof p2;
