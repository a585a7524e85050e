import type { x } from '../../exports/dxf/b';

export type X = typeof x;
