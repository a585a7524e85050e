import type * as p0 from 'konva';
import type * as p1 from '../../layout-store';

export type Uses = typeof p0 | typeof p1;
