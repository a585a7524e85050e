import type { A } from './a';

export interface B {
  readonly a?: A;
}
