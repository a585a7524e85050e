import type * as pack from './nowhere';

export type Pack = typeof pack;
