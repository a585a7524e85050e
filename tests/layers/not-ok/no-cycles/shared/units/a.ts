import type { B } from './b';

export interface A {
  readonly b?: B;
}
