import type * as pack from '@svgdotjs/svg.js';

export type Pack = typeof pack;
