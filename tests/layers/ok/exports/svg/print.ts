import type * as p0 from '../../shared/pieces/tile-outline';

export type Uses = typeof p0;
