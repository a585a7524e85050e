import type { Millimetres } from '../units/length';

/** Below this two points count as one: a millionth of a millimetre, far under any machine's step. */
export const POINT_TOLERANCE: Millimetres = 1e-6;
