import type * as pack from 'three';

export type Pack = typeof pack;
