import type * as p0 from '@svgdotjs/svg.js';
import type * as p1 from '../../../exports/svg/print';

export type Uses = typeof p0 | typeof p1;
