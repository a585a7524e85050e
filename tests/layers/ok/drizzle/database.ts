import type * as p0 from 'pg';
import type * as p1 from 'drizzle-orm';
import type * as p2 from '../shared/units/length';

export type Uses = typeof p0 | typeof p1 | typeof p2;
