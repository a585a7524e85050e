import type * as pack from 'node:fs';

export type Pack = typeof pack;
