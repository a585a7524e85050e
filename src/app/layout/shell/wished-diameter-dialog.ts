import { Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import {
  MAT_DIALOG_DATA,
  MatDialog,
  MatDialogModule,
  MatDialogRef,
} from '@angular/material/dialog';
import { applyPatch, fieldChange } from '@shared/layout/patch';
import { problemsOf } from '@shared/layout/consistency';
import { resizeChange, type Carry } from '@shared/layout/carry';
import { BOUNDS } from '@shared/layout/schema';
import {
  ringsOfStaves,
  ringsOfWidth,
  type DiameterWish,
  type RingProposal,
} from '@shared/shell/wished-diameter';
import { ChoiceBar, type Choice } from '../../drawing/choice-bar';
import { CountField } from '../../drawing/count-field';
import { LengthField } from '../../drawing/length-field';
import { LengthPipe } from '../../platform/length-pipe';
import { askCarry } from '../ask-carry';
import { madeChanges } from '../draft';
import { fieldName } from '../field-names';
import type { LayoutStore } from '../layout-store';

type Given = 'tile-width' | 'staves';

const GIVEN: readonly Choice<Given>[] = [
  { value: 'tile-width', label: 'Tile width given' },
  { value: 'staves', label: 'Staves given' },
];

/** Proposes rings for a wished diameter; taking one is one step to undo. */
@Component({
  selector: 'sl-wished-diameter-dialog',
  imports: [ChoiceBar, CountField, LengthField, LengthPipe, MatButton, MatDialogModule],
  templateUrl: './wished-diameter-dialog.html',
  styleUrl: './wished-diameter-dialog.scss',
})
export class WishedDiameterDialog {
  private readonly store = inject<LayoutStore>(MAT_DIALOG_DATA);
  private readonly dialog = inject<MatDialogRef<WishedDiameterDialog>>(MatDialogRef);
  private readonly dialogs = inject(MatDialog);
  private readonly shell = this.store.layout().shell;

  protected readonly choices = GIVEN;
  protected readonly bounds = BOUNDS;
  protected readonly unit = this.store.lengthUnit;
  protected readonly given = signal<Given>('tile-width');
  protected readonly diameter = signal(this.shell.finishedOuterDiameter);
  protected readonly tileWidth = signal(this.shell.tileWidth);
  protected readonly staves = signal(this.shell.staves);
  private readonly picked = signal(0);

  protected readonly rings = computed(() =>
    this.given() === 'tile-width'
      ? ringsOfWidth(this.wish(), this.tileWidth())
      : ringsOfStaves(this.wish(), this.staves()),
  );
  protected readonly taken = computed(() => Math.min(this.picked(), this.rings().length - 1));
  private readonly patch = computed(() => {
    const ring = this.rings()[this.taken()];
    return ring ? this.patchTo(ring, 'keep') : [];
  });
  /** Why the ring picked cannot be taken, or null. */
  protected readonly problem = computed(() => {
    const problem = problemsOf(applyPatch(this.store.layout(), this.patch()))[0];
    return problem ? `${fieldName(problem.field)} ${problem.message}.` : null;
  });

  protected pick(index: number): void {
    this.picked.set(index);
  }

  protected async take(): Promise<void> {
    const ring = this.rings()[this.taken()];
    if (!ring) return;
    const layout = this.store.layout();
    const { courses } = layout.shell;
    const carry = await askCarry(this.dialogs, layout, { staves: ring.staves, courses });
    if (carry === null) return;
    this.store.edit('Start from a wished diameter', ...this.patchTo(ring, carry));
    this.dialog.close();
  }

  private wish(): DiameterWish {
    const { shell, joint } = this.store.layout();
    return {
      outerDiameter: this.diameter(),
      wall: (shell.finishedOuterDiameter - shell.finishedInnerDiameter) / 2,
      skimAllowance: shell.skimAllowance,
      reach: joint.staveJoint.reach,
      boardThickness: shell.boardThickness,
      scheme: joint.scheme,
    };
  }

  private patchTo({ staves, tileWidth, boardThickness }: RingProposal, carry: Carry) {
    const layout = this.store.layout();
    const { outerDiameter, wall } = this.wish();
    return madeChanges([
      resizeChange(layout, { staves, courses: layout.shell.courses }, carry),
      fieldChange(layout, 'shell.tileWidth', tileWidth),
      fieldChange(layout, 'shell.finishedOuterDiameter', outerDiameter),
      fieldChange(layout, 'shell.finishedInnerDiameter', outerDiameter - 2 * wall),
      fieldChange(layout, 'shell.boardThickness', boardThickness),
    ]);
  }
}
