import { Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { fieldChange } from '@shared/layout/patch';
import { BOUNDS, type Shell } from '@shared/layout/schema';
import { ringOf } from '@shared/shell/ring';
import { formatLength } from '@shared/units/format';
import type { LengthUnit } from '@shared/units/length';
import { ChoiceBar, type Choice } from '../../drawing/choice-bar';
import { CountField } from '../../drawing/count-field';
import { heightPicture } from '../../drawing/height-picture';
import { LengthField } from '../../drawing/length-field';
import { PictureView, type PictureMaker } from '../../drawing/picture';
import { ringPicture } from '../../drawing/ring-picture';
import { stavePicture } from '../../drawing/stave-picture';
import { askCarry } from '../ask-carry';
import { fieldName } from '../field-names';
import { Findings } from '../findings';
import { LayoutProposal } from '../layout-proposal';
import { LayoutStore } from '../layout-store';
import { shellFindings } from './shell-findings';
import { WishedDiameterDialog } from './wished-diameter-dialog';

type ShellLength = Exclude<keyof Shell, 'staves' | 'courses'>;

const UNITS: readonly Choice<LengthUnit>[] = [
  { value: 'mm', label: 'Millimetres' },
  { value: 'in', label: 'Inches' },
];

const LENGTH_BOUNDS: Readonly<Record<ShellLength, { least: number; most: number }>> = {
  tileWidth: BOUNDS.tile,
  tileHeight: BOUNDS.tile,
  finishedOuterDiameter: BOUNDS.diameter,
  finishedInnerDiameter: BOUNDS.diameter,
  finishedHeight: BOUNDS.height,
  boardThickness: BOUNDS.board,
  skimAllowance: BOUNDS.skimAllowance,
};

/** Fields that belong together stand side by side. */
const ROWS: readonly { readonly names: readonly ShellLength[]; readonly hint?: string }[] = [
  { names: ['tileWidth', 'tileHeight'], hint: 'width across the outer face of the flat stave' },
  { names: ['finishedOuterDiameter'] },
  { names: ['finishedInnerDiameter'] },
  { names: ['finishedHeight'] },
  { names: ['boardThickness', 'skimAllowance'] },
];

const MEASURES: Readonly<Partial<Record<ShellLength, string>>> = {
  finishedOuterDiameter: '⌀',
  finishedInnerDiameter: '⌀',
};

/** Sizes of the shell, with the ring, one stave and the heights drawn as they are typed. */
@Component({
  selector: 'sl-shell-station',
  imports: [ChoiceBar, CountField, Findings, LengthField, MatButton, PictureView],
  templateUrl: './shell-station.html',
  styleUrls: ['../station-shape.scss', './shell-station.scss'],
})
export class ShellStation {
  protected readonly store = inject(LayoutStore);
  private readonly dialogs = inject(MatDialog);
  protected readonly proposal = new LayoutProposal(this.store);

  protected readonly units = UNITS;
  protected readonly bounds = BOUNDS;
  protected readonly unit = this.store.lengthUnit;
  protected readonly access = computed(() => (this.store.rights.editPattern() ? 'open' : 'locked'));

  /** The length fields as they stand under each other: what each shows, and what is wrong with it. */
  protected readonly rows = computed(() =>
    ROWS.map(({ names, hint }) => ({ fields: names.map((name) => this.field(name)), hint })),
  );
  protected readonly typed = computed(() => this.proposal.candidate().shell);
  private readonly drawn = this.proposal.drawn;
  protected readonly findings = computed(() => shellFindings(this.drawn(), this.unit()));
  protected readonly wall = computed(() => {
    const { shell, joint } = this.drawn();
    const ring = ringOf(shell, joint.staveJoint.reach);
    // a ring that cannot be turned to both circles has no even wall to speak of
    const turns =
      ring.turnedAway >= shell.skimAllowance - 1e-9 &&
      shell.boardThickness >= ring.boardLeast - 1e-9;
    return turns ? formatLength(ring.wall, this.unit()) : null;
  });

  protected readonly ring = computed<PictureMaker>(() => {
    const [layout, unit] = [this.drawn(), this.unit()];
    return (size) => ringPicture(layout, unit, size);
  });
  protected readonly stave = computed<PictureMaker>(() => {
    const [layout, unit] = [this.drawn(), this.unit()];
    return (size) => stavePicture(layout, unit, size);
  });
  protected readonly height = computed<PictureMaker>(() => {
    const [layout, unit] = [this.drawn(), this.unit()];
    return (size) => heightPicture(layout, unit, size);
  });

  protected set(name: ShellLength, value: number): void {
    const path = `shell.${name}` as const;
    this.proposal.wish({ [path]: value }, `Set ${fieldName(path).toLowerCase()}`);
  }

  protected preview(part: 'staves' | 'courses', count: number): void {
    this.proposal.preview(this.gridWith(part, count));
  }

  protected async resize(part: 'staves' | 'courses', count: number): Promise<void> {
    const grid = this.gridWith(part, count);
    const carry = await askCarry(this.dialogs, this.store.layout(), grid);
    if (carry === null) this.proposal.leaveSize();
    else this.proposal.resize(grid, carry, `Set the number of ${part}`);
  }

  protected showIn(unit: LengthUnit): void {
    this.store.edit('Change the unit', fieldChange(this.store.layout(), 'lengthUnit', unit));
  }

  protected startFromDiameter(): void {
    this.dialogs.open<WishedDiameterDialog, LayoutStore>(WishedDiameterDialog, {
      data: this.store,
      width: '640px',
    });
  }

  private field(name: ShellLength) {
    const path = `shell.${name}` as const;
    return {
      name,
      label: fieldName(path),
      value: this.typed()[name],
      measure: MEASURES[name] ?? '',
      ...LENGTH_BOUNDS[name],
      problem: this.proposal.problemOf(path),
    };
  }

  private gridWith(part: 'staves' | 'courses', count: number) {
    const { staves, courses } = this.typed();
    return { staves, courses, [part]: count };
  }
}
