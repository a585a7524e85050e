import type * as pack from 'konva';

export type Pack = typeof pack;
