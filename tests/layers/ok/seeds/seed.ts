import type * as p0 from '../drizzle/database';
import type * as p1 from '../shared/pieces/tile-outline';

export type Uses = typeof p0 | typeof p1;
