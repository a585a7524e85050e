/** What a workshop sets about a joint; the schema of the layout file has the same shapes. */
import type { Degrees } from '../units/angle';
import type { Millimetres } from '../units/length';

/** A round head on a filleted neck. */
export interface RoundParameters {
  readonly profile: 'round';
  readonly headRadius: Millimetres;
  readonly filletRadius: Millimetres;
  readonly reach: Millimetres;
}

/** A dovetail with rounded tips; `rootWidth` lies on the edge line between the flanks drawn sharp. */
export interface DovetailParameters {
  readonly profile: 'dovetail';
  readonly rootWidth: Millimetres;
  /** How far the flanks lean out from the square. */
  readonly flankAngle: Degrees;
  readonly reach: Millimetres;
  readonly tipRadius: Millimetres;
  readonly rootRadius: Millimetres;
}

export type JointParameters = RoundParameters | DovetailParameters;

/** Which tiles carry tabs and which sockets. */
export type Scheme = 'alternating' | 'one-way';
