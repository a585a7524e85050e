import type { JointParameters } from '@shared/joint/parameters';
import { BOUNDS } from '@shared/layout/schema';

/** A length of a joint as the screen asks for it. */
export interface JointField {
  readonly parameter: string;
  readonly label: string;
  readonly least: number;
  readonly most: number;
}

const ROUND: readonly JointField[] = [
  { parameter: 'headRadius', label: 'Head radius', ...BOUNDS.headRadius },
  { parameter: 'filletRadius', label: 'Neck fillet radius', ...BOUNDS.radius },
  { parameter: 'reach', label: 'Tab reach', ...BOUNDS.reach },
];

const DOVETAIL: readonly JointField[] = [
  { parameter: 'rootWidth', label: 'Root width', ...BOUNDS.rootWidth },
  { parameter: 'reach', label: 'Tab reach', ...BOUNDS.reach },
  { parameter: 'tipRadius', label: 'Tip radius', ...BOUNDS.radius },
  { parameter: 'rootRadius', label: 'Root fillet radius', ...BOUNDS.radius },
];

/** The lengths of a profile, in the order of the screen. */
export function jointFields(profile: JointParameters['profile']): readonly JointField[] {
  return profile === 'round' ? ROUND : DOVETAIL;
}

/** The value of one of them. */
export function jointFieldValue(parameters: JointParameters, parameter: string): number {
  return Number((parameters as unknown as Readonly<Record<string, unknown>>)[parameter]);
}

/** The joint with one of its figures changed. */
export function withJointField(
  parameters: JointParameters,
  parameter: string,
  value: number,
): JointParameters {
  return { ...parameters, [parameter]: value };
}
