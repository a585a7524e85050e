import { Component, computed, DestroyRef, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatProgressBar } from '@angular/material/progress-bar';
import { relayChange } from '@shared/layout/patch';
import { DITHERINGS, type Dithering } from '@shared/wood/dithering';
import { catchError, EMPTY, Subject, switchMap } from 'rxjs';
import { ChoiceBar } from '../../../drawing/choice-bar';
import { ProblemList } from '../../../drawing/problem-list';
import { apiFailureOf } from '../../../platform/api-problem';
import type { LayoutStore } from '../../layout-store';
import { tilesWords } from '../sentence-words';
import {
  fillingCrop,
  quartersAndLean,
  turnedCrop,
  wholeCrop,
  widthBounds,
  type Crop,
} from './crop';
import { CropFrame } from './crop-frame';
import { PatternPreview } from './pattern-preview';
import { PictureLaying } from './picture-laying';
import { PictureReading } from './picture-reading';
import { PictureSource } from './picture-source';
import { PictureWork } from './picture-work';
import { WoodShares, type ShareChange } from './wood-shares';

const DITHERING_WORDS: Record<Dithering, string> = {
  plain: 'Plain',
  ordered: 'Ordered',
  'error-diffusion': 'Error diffusion',
};

const DITHERING_HINTS: Record<Dithering, string> = {
  plain: 'Every tile takes the wood nearest to its colour: best for marks and letters.',
  ordered: 'Tones between two woods become a regular weave of both.',
  'error-diffusion': 'Tones between woods become scattered tiles: best for photographs.',
};

/** Lays a picture as tiles: read, cropped and turned, seen first. Closes with the number of tiles it laid. */
@Component({
  selector: 'sl-from-picture-dialog',
  imports: [
    ChoiceBar,
    CropFrame,
    MatButton,
    MatDialogModule,
    MatProgressBar,
    PatternPreview,
    PictureSource,
    ProblemList,
    WoodShares,
  ],
  templateUrl: './from-picture-dialog.html',
  styleUrl: './from-picture-dialog.scss',
})
export class FromPictureDialog {
  protected readonly store = inject<LayoutStore>(MAT_DIALOG_DATA);
  private readonly dialog = inject<MatDialogRef<FromPictureDialog, number>>(MatDialogRef);
  private readonly reading = inject(PictureReading);
  private readonly laying = new PictureLaying();
  protected readonly work = new PictureWork(this.store, this.laying);
  private readonly files = new Subject<File>();

  protected readonly ditherings = DITHERINGS.map((value) => ({
    value,
    label: DITHERING_WORDS[value],
  }));
  protected readonly ditheringHint = computed(() => DITHERING_HINTS[this.work.dithering()]);
  /** The name of the file that is being read, or null. */
  protected readonly sending = signal<string | null>(null);
  /** Why the last file was not taken, or null. */
  protected readonly refusal = signal<string | null>(null);
  protected readonly failed = this.laying.failed;

  protected readonly lean = computed(() => quartersAndLean(this.work.crop().turn).lean);
  protected readonly leanWords = computed(() => `${this.lean().toFixed(1)}°`);
  protected readonly sizeBounds = computed(() => {
    const framed = this.work.framed();
    const { least, most } = framed
      ? widthBounds(framed, this.work.crop().turn)
      : { least: 1, most: 1 };
    return { least: Math.log2(least), most: Math.log2(most) };
  });
  protected readonly sizeStep = computed(() => Math.log2(this.work.crop().width));

  protected readonly laidLayout = computed(() => ({
    ...this.store.soundLayout(),
    woods: this.store.woods(),
    cells: this.work.cells() ?? this.store.cells(),
  }));
  private readonly change = computed(() => {
    const cells = this.work.cells();
    return cells && relayChange(this.store.cells(), cells);
  });
  /** What laying it would do, or why it cannot be laid. */
  protected readonly outcome = computed(() => {
    if (this.work.woods().length === 0) return 'Take at least one wood.';
    if (!this.work.settled()) return 'Choosing woods…';
    const change = this.change();
    return change
      ? `${tilesWords(change.positions.length)} would change.`
      : 'The pattern is already laid like this.';
  });
  protected readonly ready = computed(
    () => this.work.settled() && this.work.woods().length > 0 && this.change() !== null,
  );
  protected readonly previewLabel = computed(() => {
    const counts = this.work.counts() ?? [];
    const each = this.store.woods().map(({ name }, i) => `${name} ${tilesWords(counts[i] ?? 0)}`);
    return `The pattern as it would be, from the seam once round: ${each.join(', ')}.`;
  });

  constructor() {
    inject(DestroyRef).onDestroy(() => this.laying.end());
    this.files
      .pipe(
        switchMap((file) => this.read(file)),
        takeUntilDestroyed(),
      )
      .subscribe((picture) => {
        this.sending.set(null);
        this.work.show(picture);
      });
  }

  protected take(file: File): void {
    this.refusal.set(null);
    this.sending.set(file.name === '' ? 'the picture' : file.name);
    this.files.next(file);
  }

  protected setContrast(slider: HTMLInputElement): void {
    this.work.contrast.set(slider.valueAsNumber / 100);
  }

  protected setShare({ key, steps }: ShareChange): void {
    this.work.setShare(key, steps);
  }

  protected setSize(slider: HTMLInputElement): void {
    this.work.setCrop({ ...this.work.crop(), width: 2 ** slider.valueAsNumber });
  }

  protected setLean(slider: HTMLInputElement): void {
    const { quarters } = quartersAndLean(this.work.crop().turn);
    this.turnTo(90 * quarters + slider.valueAsNumber);
  }

  protected turnBy(degrees: number): void {
    this.turnTo(this.work.crop().turn + degrees);
  }

  protected fill(): void {
    this.frame(fillingCrop);
  }

  protected showWhole(): void {
    this.frame(wholeCrop);
  }

  protected lay(): void {
    const change = this.change();
    if (!change || !this.ready()) return;
    this.store.edit('Lay a picture', change);
    this.dialog.close(change.positions.length);
  }

  private turnTo(turn: number): void {
    const framed = this.work.framed();
    if (framed) this.work.setCrop(turnedCrop(this.work.crop(), turn, framed));
  }

  private frame(crop: typeof fillingCrop): void {
    const framed = this.work.framed();
    const { turn }: Crop = this.work.crop();
    if (framed) this.work.setCrop(crop(framed, turn));
  }

  private read(file: File) {
    return this.reading.read(file).pipe(
      catchError((thrown: unknown) => {
        this.sending.set(null);
        this.refusal.set(apiFailureOf(thrown).message);
        return EMPTY;
      }),
    );
  }
}
