import type { MatDialog } from '@angular/material/dialog';
import { waysToCarry, type Carry } from '@shared/layout/carry';
import type { Grid } from '@shared/layout/cells';
import { gridStateOf } from '@shared/layout/patch';
import type { Layout } from '@shared/layout/schema';
import { firstValueFrom } from 'rxjs';
import { CarryDialog, type CarryQuestion } from './carry-dialog';

/**
 * How the pattern shall be carried over to another size, or null when the person leaves the size as it is.
 * Asks only where there is something to choose.
 */
export async function askCarry(
  dialogs: MatDialog,
  layout: Layout,
  to: Grid,
): Promise<Carry | null> {
  const ways = waysToCarry(gridStateOf(layout), to);
  const [first, second] = ways;
  if (!second) return first?.carry ?? 'keep';
  const asked = dialogs.open<CarryDialog, CarryQuestion, Carry>(CarryDialog, {
    data: { layout, ways },
    width: '720px',
    maxWidth: '94vw',
  });
  return (await firstValueFrom(asked.afterClosed())) ?? null;
}
