import type * as pack from 'drizzle-orm';

export type Pack = typeof pack;
