import { Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { FINISHING_MARGIN, WEB_MINIMUM_MM } from '@shared/checks/check';
import type { JointParameters } from '@shared/joint/parameters';
import { smallestJoint } from '@shared/joint/smallest-joint';
import type { Layout } from '@shared/layout/schema';
import { formatCutterFigure, formatLength, formatShare } from '@shared/units/format';
import type { LengthUnit } from '@shared/units/length';
import { FigureText } from '../../drawing/figure-text';
import { LengthField } from '../../drawing/length-field';
import { LengthPipe } from '../../platform/length-pipe';

export interface SmallestJointQuestion {
  readonly layout: Layout;
  readonly lengthUnit: LengthUnit;
  /** What will be shaped: "both joints". */
  readonly joint: string;
}

/** Asks how much undercut is wished and offers the least round joint for the cutter. Closes with it. */
@Component({
  selector: 'sl-smallest-joint-dialog',
  imports: [FigureText, LengthField, LengthPipe, MatButton, MatDialogModule],
  template: `
    <h2 mat-dialog-title>Smallest joint this cutter can make</h2>
    <mat-dialog-content>
      <p><sl-figure-text [text]="given" /></p>
      <sl-length-field
        label="Wished undercut on each side"
        hint="How far the head is wider than the neck: what locks the joint."
        [value]="undercut()"
        [least]="0.05"
        [most]="25"
        [lengthUnit]="unit"
        (changed)="undercut.set($event)"
      />
      <dl>
        <div>
          <dt>Neck fillet radius</dt>
          <dd>{{ joint().parameters.filletRadius | length: unit }}</dd>
        </div>
        <div>
          <dt>Head radius</dt>
          <dd>{{ joint().parameters.headRadius | length: unit }}</dd>
        </div>
        <div>
          <dt>Tab reach</dt>
          <dd>{{ joint().parameters.reach | length: unit }}</dd>
        </div>
        <div>
          <dt>Neck</dt>
          <dd>{{ joint().neck | length: unit }}</dd>
        </div>
      </dl>
      <p class="tile" [class.small]="tooSmall()" role="status">
        <sl-figure-text [text]="tile()" />
      </p>
    </mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton type="button" mat-dialog-close>Not now</button>
      <button matButton="filled" type="button" [disabled]="tooSmall()" (click)="take()">
        Use it for {{ question.joint }}
      </button>
    </mat-dialog-actions>
  `,
  styles: `
    dl {
      display: grid;
      grid-template-columns: 1fr 1fr;
      gap: 14px;
      margin: 18px 0;
    }
    dt {
      color: var(--mute);
      font-size: 14px;
    }
    dd {
      margin: 0;
      font-size: 20px;
      font-weight: 800;
    }
    .tile {
      padding: 10px 14px;
      border-radius: var(--radius);
      background: var(--pale-blue);
    }
    .small {
      background: var(--well);
      color: var(--stop-ink);
    }
  `,
})
export class SmallestJointDialog {
  protected readonly question = inject<SmallestJointQuestion>(MAT_DIALOG_DATA);
  private readonly dialog =
    inject<MatDialogRef<SmallestJointDialog, JointParameters>>(MatDialogRef);
  private readonly layout = this.question.layout;
  protected readonly unit = this.question.lengthUnit;

  /** Well over the clearance, so that the joint locks, and little enough to go together. */
  protected readonly undercut = signal(
    Math.max(0.4, Math.ceil(this.layout.joint.clearance * 40) / 10),
  );
  protected readonly given =
    `For the ${formatCutterFigure(this.layout.cutter.diameter, this.unit)} ${this.unit} cutter, ` +
    `with ${formatShare(FINISHING_MARGIN)} to turn freely and a clearance of ` +
    `${formatLength(this.layout.joint.clearance, this.unit)}.`;

  protected readonly joint = computed(() =>
    smallestJoint({
      cutterDiameter: this.layout.cutter.diameter,
      finishingMargin: FINISHING_MARGIN,
      clearance: this.layout.joint.clearance,
      undercut: this.undercut(),
      scheme: this.layout.joint.scheme,
      webMinimum: WEB_MINIMUM_MM,
    }),
  );
  private readonly side = Math.min(this.layout.shell.tileWidth, this.layout.shell.tileHeight);
  protected readonly tooSmall = computed(() => this.side < this.joint().tileLeast);
  protected readonly tile = computed(() => {
    const least = formatLength(this.joint().tileLeast, this.unit);
    const side = formatLength(this.side, this.unit);
    return this.tooSmall()
      ? `It needs a tile of ${least} or more; yours has a side of ${side}. Take larger tiles, a smaller cutter or less undercut.`
      : `It allows tiles down to ${least}; yours have a side of ${side}.`;
  });

  protected take(): void {
    this.dialog.close(this.joint().parameters);
  }
}
