import type * as p0 from '@angular/router';
import type * as p1 from '../../../shared/units/length';

export type Uses = typeof p0 | typeof p1;
