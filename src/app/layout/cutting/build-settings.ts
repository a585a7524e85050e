import { Component, computed, effect, inject, untracked } from '@angular/core';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatSlideToggle } from '@angular/material/slide-toggle';
import { fieldChange } from '@shared/layout/patch';
import { BOUNDS, type Build } from '@shared/layout/schema';
import { outsideGap } from '@shared/shell/outside-gap';
import { formatLength } from '@shared/units/format';
import { ChoiceBar, type Choice } from '../../drawing/choice-bar';
import { FigureText } from '../../drawing/figure-text';
import { LayoutStore } from '../layout-store';
import { figureWithin } from './figure-within';

const WAYS: readonly Choice<Build['way']>[] = [
  { value: 'stave-by-stave', label: 'Stave by stave' },
  { value: 'tile-by-tile', label: 'Tile by tile' },
];
const PERCENT = { least: BOUNDS.spareShare.least * 100, most: BOUNDS.spareShare.most * 100 };

/** How the shell is built and how many spares are cut: settings of the layout, for whoever may set them. */
@Component({
  selector: 'sl-build-settings',
  imports: [
    ChoiceBar,
    FigureText,
    MatFormFieldModule,
    MatInput,
    MatSlideToggle,
    ReactiveFormsModule,
  ],
  templateUrl: './build-settings.html',
  styleUrl: './build-settings.scss',
})
export class BuildSettings {
  private readonly store = inject(LayoutStore);

  protected readonly ways = WAYS;
  protected readonly build = computed(() => this.store.layout().build);
  protected readonly locked = computed(() => !this.store.rights.editJoint());
  protected readonly wayText = computed(() => {
    const { build, shell, lengthUnit } = this.store.layout();
    if (build.way === 'stave-by-stave') {
      return 'Blanks are cut, glued into staves and levelled; then the stave edges are cut in the jig. The outlines in the bundle show each tile finished on all four sides: for a blank, leave its long sides straight and wide.';
    }
    const gap = formatLength(outsideGap(shell), lengthUnit);
    return `All four sides are cut square: only for laser, template or flat work. Round the ring it leaves a gap of ${gap} outside at every stave joint.`;
  });
  protected readonly turnOverText = computed(() =>
    this.build().turnOver
      ? 'Courses B, D, F… are cut face down, so that the taper of a cut evens out at their joints.'
      : 'All pieces are cut face up: a taper of the cut opens every joint on one side.',
  );
  protected readonly share = new FormControl('', {
    nonNullable: true,
    validators: figureWithin(PERCENT, { whole: false }),
  });
  protected readonly minimum = new FormControl('', {
    nonNullable: true,
    validators: figureWithin(BOUNDS.spareMinimum, { whole: true }),
  });

  constructor() {
    effect(() => {
      const { spareShare, spareMinimum } = this.build();
      untracked(() => {
        show(this.share, Number((spareShare * 100).toFixed(4)));
        show(this.minimum, spareMinimum);
      });
    });
    effect(() => {
      for (const field of [this.share, this.minimum]) {
        if (this.locked()) field.disable({ emitEvent: false });
        else field.enable({ emitEvent: false });
      }
    });
  }

  protected setWay(way: Build['way']): void {
    this.store.edit('Way of building', fieldChange(this.store.layout(), 'build.way', way));
  }

  protected setTurnOver({ checked }: { readonly checked: boolean }): void {
    const change = fieldChange(this.store.layout(), 'build.turnOver', checked);
    this.store.edit('Turning pieces over', change);
  }

  /** Set when the field is left, so that one figure is one step to undo. */
  protected setShare(): void {
    if (this.share.invalid) return;
    const share = Number(this.share.value) / 100;
    this.store.edit('Share of spares', fieldChange(this.store.layout(), 'build.spareShare', share));
  }

  protected setMinimum(): void {
    if (this.minimum.invalid) return;
    const least = Number(this.minimum.value);
    const change = fieldChange(this.store.layout(), 'build.spareMinimum', least);
    this.store.edit('Least spares of a kind', change);
  }
}

/** Follows the document, except where the field already holds that figure. */
function show(field: FormControl<string>, figure: number): void {
  if (field.value === '' || Number(field.value) !== figure) field.setValue(`${figure}`);
}
