/** The picture in the dialog, what is wished of it, and the pattern that comes of it. */
import { computed, effect, signal, untracked, type Signal } from '@angular/core';
import { countWoods } from '@shared/layout/cells';
import type { Dithering } from '@shared/wood/dithering';
import type { LayoutStore } from '../../layout-store';
import { aspectOf, fillingCrop, heldCrop, type Crop, type Framed } from './crop';
import { laidOver, type PatternWish } from './picture-pattern';
import type { PictureLaying } from './picture-laying';
import type { ReadPicture } from './picture-reading';
import { wishedWoods, type ShareSteps, type WoodWishes } from './wood-wishes';

export class PictureWork {
  private readonly shown = signal<ReadPicture | null>(null);
  private readonly wishedCrop = signal<Crop>({ turn: 0, x: 0, y: 0, width: 1 });

  readonly picture = this.shown.asReadonly();
  readonly dithering = signal<Dithering>('plain');
  readonly contrast = signal(1);
  readonly woodWishes = signal<WoodWishes>(new Map());
  /** The picture with the frame of the shell over it; null without a picture. */
  readonly framed: Signal<Framed | null> = computed(() => {
    const picture = this.shown();
    return picture && { size: picture.pixels, aspect: aspectOf(this.store.layout().shell) };
  });
  /** Where the shell is cut out; within its bounds even when somebody changes the shell meanwhile. */
  readonly crop = computed(() => {
    const framed = this.framed();
    return framed ? heldCrop(this.wishedCrop(), framed) : this.wishedCrop();
  });
  readonly woods = computed(() => wishedWoods(this.store.woods(), this.woodWishes()));

  private readonly wish = computed<PatternWish | null>(() => {
    const framed = this.framed();
    if (!framed || this.woods().length === 0) return null;
    return {
      crop: this.crop(),
      aspect: framed.aspect,
      grid: this.store.grid(),
      dithering: this.dithering(),
      contrast: this.contrast(),
      woods: this.woods(),
    };
  });

  /** The whole pattern with the picture laid on it; null while there is none for this shell. */
  readonly cells = computed(() => {
    const pattern = this.laying.pattern();
    const cells = this.store.cells();
    if (!this.wish() || pattern?.length !== cells.length) return null;
    return laidOver(cells, pattern);
  });
  readonly counts = computed(() => {
    const cells = this.cells();
    return cells && countWoods(cells, this.store.woods().length);
  });
  /** True once `cells` is what the settings say. */
  readonly settled = computed(() => this.cells() !== null && !this.laying.busy());

  constructor(
    private readonly store: LayoutStore,
    private readonly laying: PictureLaying,
  ) {
    effect(() => {
      const wish = this.wish();
      if (wish) untracked(() => this.laying.wish(wish));
    });
  }

  show(picture: ReadPicture): void {
    this.laying.show(picture.pixels);
    this.shown.set(picture);
    const framed = this.framed();
    if (framed) this.wishedCrop.set(fillingCrop(framed));
  }

  setCrop(crop: Crop): void {
    this.wishedCrop.set(crop);
  }

  setShare(key: string, steps: ShareSteps): void {
    this.woodWishes.update((wishes) => new Map(wishes).set(key, steps));
  }
}
