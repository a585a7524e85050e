import type * as p0 from '../layout-store';
import type * as p1 from '../../drawing/section';

export type Uses = typeof p0 | typeof p1;
