import type * as p0 from 'drizzle-orm';
import type * as p1 from '../../drizzle/database';

export type Uses = typeof p0 | typeof p1;
